/**
 * Wall parameter of Zahoor's circumferential forms: A = (0.125 R/t − 0.25)^¼ to R/t = 10, (0.4 R/t − 3)^¼ beyond.
 * @param ratio mean radius over thickness, R/t [-]
 * @returns A [-]
 * @validity 5 ≤ R/t ≤ 20
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example zahoorWall(10) // 1
 */
export const zahoorWall = (ratio: number): number =>
  Math.max(ratio <= 10 ? 0.125 * ratio - 0.25 : 0.4 * ratio - 3, 0) ** 0.25;

/**
 * Circumferential through-wall crack, axial tension: F = 1 + A [5.3303 (θ/π)^1.5 + 18.773 (θ/π)^4.24].
 * @param share half angle over π, θ/π [-]
 * @param ratio mean radius over thickness, R/t [-]
 * @returns factor F in K = σ F √(πRθ) [-]
 * @validity θ/π ≤ 0.55, 5 ≤ R/t ≤ 20
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example circumferentialTension(0.1, 10) // 1.16963915951
 */
export const circumferentialTension = (share: number, ratio: number): number =>
  1 + zahoorWall(ratio) * (5.3303 * share ** 1.5 + 18.773 * share ** 4.24);

/**
 * The same for bending of the whole pipe, σ the stress at the outermost fibre, the crack centred there:
 * F = 1 + A [4.5967 (θ/π)^1.5 + 2.6422 (θ/π)^4.24].
 * @param share half angle over π, θ/π [-]
 * @param ratio mean radius over thickness, R/t [-]
 * @returns factor F in K = σ F √(πRθ) [-]
 * @validity θ/π ≤ 0.55, 5 ≤ R/t ≤ 20
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example circumferentialBending(0.1, 10) // 1.14551245995
 */
export const circumferentialBending = (share: number, ratio: number): number =>
  1 + zahoorWall(ratio) * (4.5967 * share ** 1.5 + 2.6422 * share ** 4.24);

/**
 * The same for internal pressure, γ = θ √(R/t): F = 1 + 0.1501 γ^1.5 to γ = 2, 0.8875 + 0.2625 γ beyond;
 * σ the axial membrane stress. The two meet within 0.9 %.
 * @param angle half angle, θ [rad]
 * @param ratio mean radius over thickness, R/t [-]
 * @returns factor F in K = σ F √(πRθ) [-]
 * @validity γ ≤ 5 (range from memory)
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example circumferentialPressure(0.5, 16) // 1.42454691
 */
export function circumferentialPressure(angle: number, ratio: number): number {
  const gamma = angle * Math.sqrt(ratio);
  return gamma <= 2 ? 1 + 0.1501 * gamma ** 1.5 : 0.8875 + 0.2625 * gamma;
}

/**
 * Crack around the whole inside of a pipe in tension: F = 1.1 + A [1.948 (a/t)^1.5 + 0.3342 (a/t)^4.2]. A cross
 * check: up to 4 % from finite elements at Ri/t 5 to 10, 8 % at 20.
 * @param depth a/t [-]
 * @param ratio radius over thickness, R/t [-]
 * @returns factor F in K = σ F √(πa) [-]
 * @validity 5 ≤ R/t ≤ 20, a/t ≤ 0.8
 * @source Zahoor, as given in Anderson, Fracture Mechanics (from memory)
 * @example fullCircumferenceZahoor(0.5, 20) // 2.15707047191
 */
export const fullCircumferenceZahoor = (depth: number, ratio: number): number =>
  1.1 + zahoorWall(ratio) * (1.948 * depth ** 1.5 + 0.3342 * depth ** 4.2);

/**
 * Axial surface crack inside a pipe under pressure, ξ = (a/t)(2c/a):
 * F = 1.12 + 0.053ξ + 0.0055ξ² + (1 + 0.02ξ + 0.0191ξ²)(20 − R/t)²/1400. A cross check.
 * @param depth a/t [-]
 * @param aspect a/c [-]
 * @param ratio radius over thickness, R/t [-]
 * @returns factor F in K = (pR/t) F √(πa/Q) at the deepest point [-]
 * @validity 5 ≤ R/t ≤ 20, 2c/a ≤ 12, a/t ≤ 0.8
 * @source Zahoor, as given in Anderson, Fracture Mechanics (from memory)
 * @example axialInsideZahoor(0.5, 0.4, 10) // 1.37040178571
 */
export function axialInsideZahoor(depth: number, aspect: number, ratio: number): number {
  const xi = (2 * depth) / aspect;
  const wall = (20 - ratio) ** 2 / 1400;
  return 1.12 + (0.053 + 0.0055 * xi) * xi + (1 + (0.02 + 0.0191 * xi) * xi) * wall;
}
