// values of published equations, computed with a second, separate program

/** Ellipse in an infinite body, 1 MPa: a, c [mm], φ [°], K [MPa·√mm], relative tolerance. */
export const ELLIPSE_VALUES = [
  [1, 1, 0, 1.1283791671, 1e-9],
  [1, 2, 90, 1.46356057074, 1e-9],
  [1, 5, 45, 1.43277763858, 1e-9],
  [1, 5, 0, 0.754558571281, 1e-9],
  [2, 1, 90, 1.03489360425, 1e-9],
  [2, 1, 0, 1.46356057074, 1e-9],
  [1, 10000, 90, 1.77245385091, 1e-6],
] as const;

/** Corner flaw in a plate: a, c, t, W [mm], φ [°], membrane and bending stress [MPa], K [MPa·√mm]. */
export const CORNER_VALUES = [
  [2, 4, 10, 50, 90, 100, 0, 248.223060999],
  [2, 4, 10, 50, 0, 100, 0, 177.136417871],
  [5, 5, 10, 50, 0, 100, 40, 452.085647212],
  [6, 4, 10, 50, 90, 100, 0, 274.796273803],
  [6, 4, 10, 50, 45, 0, 100, 95.268668294],
] as const;

/** Flaws at a hole of radius 5 in a plate 100 wide: a, c, full thickness [mm], φ [°], stresses [MPa], K [MPa·√mm]. */
export const HOLE_VALUES = [
  ['corner 1', 2, 2, 10, 90, 100, 0, 459.613196771],
  ['corner 2', 4, 2, 10, 45, 100, 0, 403.299332074],
  ['corner 2', 3, 4, 10, 0, 0, 100, 258.600579522],
  ['surface 2', 2, 2, 20, 0, 100, 0, 305.212023828],
  ['surface 1', 3, 4, 10, 90, 100, 0, 562.80294943],
] as const;
