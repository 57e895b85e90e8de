/**
 * M1 + M2 (a/t)² + M3 (a/t)⁴ of a crack that starts from a face or a hole.
 * @param a depth, a [mm]
 * @param c half length, c [mm]
 * @param depth a/t [-]
 * @returns boundary polynomial [-]
 * @validity 0 < a/c ≤ 2, a/t < 1, fitted to 0.8
 * @source Newman and Raju, NASA TM-85793 (1984), surface crack and corner crack at a hole
 * @example surfacePolynomial(mm(1), mm(1), 0.5) // 1.08378788
 */
export function surfacePolynomial(a: number, c: number, depth: number): number {
  const depth2 = depth * depth;
  const long = a <= c;
  const r = long ? a / c : c / a;
  const m1 = long ? 1.13 - 0.09 * r : Math.sqrt(r) * (1 + 0.04 * r);
  const m2 = long ? -0.54 + 0.89 / (0.2 + r) : 0.2 * r ** 4;
  const m3 = long ? 0.5 - 1 / (0.65 + r) + 14 * (1 - r) ** 24 : -0.11 * r ** 4;
  return m1 + (m2 + m3 * depth2) * depth2;
}

/**
 * Rise of K towards the face the crack starts from, g = 1 + [0.1 + 0.35 (a/t)²](1 − sin φ)².
 * @param a depth, a [mm]
 * @param c half length, c [mm]
 * @param depth a/t [-]
 * @param sine sin φ [-]
 * @returns factor g [-]
 * @validity 0 < a/c ≤ 2, a/t < 1, fitted to 0.8
 * @source Newman and Raju, NASA TM-85793 (1984), surface crack and corner crack at a hole
 * @example riseTowardsFace(1, 1, 0.5, 0) // 1.1875
 */
export function riseTowardsFace(a: number, c: number, depth: number, sine: number): number {
  const towards = 1 - sine;
  return 1 + (0.1 + 0.35 * (a <= c ? 1 : c / a) * depth * depth) * towards * towards;
}

/**
 * Share of the outer-fibre bending stress that acts at a point of the front, H = H1 + (H2 − H1) sin^p φ.
 * @param a depth, a [mm]
 * @param c half length, c [mm]
 * @param depth a/t [-]
 * @param sine sin φ [-]
 * @param deepest first coefficient of the square term of H2: 0.55 surface crack, 0.64 corner crack [-]
 * @returns share H [-]
 * @validity 0 < a/c ≤ 2, a/t < 1, fitted to 0.8
 * @source Newman and Raju, NASA TM-85793 (1984), surface and corner crack
 * @example bendingShare(1, 1, 0.5, 1, 0.55) // 0.3225
 */
export function bendingShare(
  a: number,
  c: number,
  depth: number,
  sine: number,
  deepest: number,
): number {
  const long = a <= c;
  const r = long ? a / c : c / a;
  const r75 = r ** 0.75;
  const h1 = long
    ? 1 - 0.34 * depth - 0.11 * r * depth
    : 1 + ((0.55 - 1.93 * r75 + 1.38 * r75 * r75) * depth - 0.04 - 0.41 * r) * depth;
  const h2 = long
    ? 1 + ((deepest - 1.05 * r75 + 0.47 * r75 * r75) * depth - 1.22 - 0.12 * r) * depth
    : 1 + ((deepest - 0.72 * r75 + 0.14 * r75 * r75) * depth - 2.11 + 0.77 * r) * depth;
  return h1 + (h2 - h1) * sine ** (0.2 + r + 0.6 * depth);
}
