// values of published equations, computed with a second, separate program

/** Surface flaw in a plate: a, c, t, W [mm], φ [°], membrane and bending stress [MPa], K [MPa·√mm]. */
export const EQUATION_VALUES = [
  [2, 10, 20, 100, 90, 100, 0, 270.094735805],
  [5, 10, 10, 200, 90, 150, 0, 612.970261455],
  [5, 10, 10, 200, 45, 80, 60, 407.400944211],
  [8, 8, 10, 80, 0, 100, 50, 640.97753218],
  [8, 5, 10, 80, 90, 100, 0, 254.053981327],
  [3, 30, 12, 400, 90, 100, 0, 386.131658295],
] as const;

/** Embedded flaw at mid-thickness: a, c, half thickness [mm], φ [°], K at 100 MPa [MPa·√mm]. */
export const EMBEDDED_VALUES = [
  [2, 4, 10, 90, 208.048186069],
  [2, 4, 4, 90, 219.00123454],
  [2, 4, 4, 0, 150.776410968],
  [4, 2, 8, 90, 148.471626074],
  [4, 2, 8, 0, 208.126183618],
] as const;

/** Axial flaw inside a pressurised cylinder: p [MPa], a, c, t, Ri [mm], φ [°], K [MPa·√mm]. */
export const PRESSURISED_VALUES = [
  [10, 5, 12.5, 10, 100, 90, 485.973213016],
  [10, 5, 25, 10, 40, 90, 284.716935124],
  [10, 8, 20, 10, 100, 0, 593.134898253],
] as const;
