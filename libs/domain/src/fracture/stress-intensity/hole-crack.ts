import type { Mm } from '../../units/quantity';

const powers = (l: number, s0: number, s1: number, s2: number, s3: number, s4: number) =>
  s0 + l * (s1 + l * (s2 + l * (s3 + l * s4)));

/**
 * Two equal cracks at a circular hole in a wide plate in tension: F in K = F σ √(πc), ℓ = R/(R + c).
 * @param length crack length from the edge of the hole, c [mm]
 * @param radius radius of the hole, R [mm]
 * @returns factor F [-]
 * @validity c/R ≤ 3 within 0.15 %, 0.5 % low at 5, exact without end
 * @source Newman 1971, fit of Bowie's problem
 * @example holeTwoCracksFactor(mm(1), mm(1)) // 1.47275
 */
export const holeTwoCracksFactor = (length: Mm, radius: Mm): number =>
  twoCracksFactor(radius / (radius + length));

/**
 * The same factor by the ratio ℓ of the hole radius to the distance from its centre.
 * @param l R/(R + c) [-]
 * @returns factor F [-]
 * @validity 0 ≤ ℓ ≤ 1
 * @source Newman 1971, fit of Bowie's problem
 * @example twoCracksFactor(1) // 3.361
 */
export const twoCracksFactor = (l: number): number => powers(l, 1, 0.358, 1.425, -1.578, 2.156);

/**
 * One crack at a circular hole in a wide plate in tension: F in K = F σ √(πc).
 * @param length crack length from the edge of the hole, c [mm]
 * @param radius radius of the hole, R [mm]
 * @returns factor F [-]
 * @validity any c/R, 0.6 %; a long crack counts with its total length, F → 1/√2
 * @source Newman; Grandt 1975
 * @example holeOneCrackFactor(mm(1), mm(1)) // 1.307607
 */
export const holeOneCrackFactor = (length: Mm, radius: Mm): number =>
  powers(radius / (radius + length), Math.SQRT1_2, 0.7548, 0.3415, 0.642, 0.9196);

/**
 * Two equal cracks at a circular hole in a wide plate, equal tension both ways: F in K = F σ √(πc).
 * @param length crack length from the edge of the hole, c [mm]
 * @param radius radius of the hole, R [mm]
 * @returns factor F [-]
 * @validity any c/R, within 1.9 %
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example holeBiaxialFactor(mm(1), mm(1)) // 1.342875
 */
export function holeBiaxialFactor(length: Mm, radius: Mm): number {
  const rest = radius / (radius + length);
  return 1 + rest * (0.5 + 0.743 * rest * rest);
}

/**
 * Short crack at the end of an elliptical hole, across the load: 1.1215 Kt/√(1 + 4.5 c/ρ), Kt = 1 + 2A/B,
 * ρ = B²/A; F in K = F σ √(πc).
 * @param length crack length from the notch, c [mm]
 * @param across half axis of the hole along the crack, A [mm]
 * @param along half axis along the load, B [mm]
 * @returns factor F [-]
 * @validity within 1 % for c/ρ ≤ 0.2, 4 % to c/ρ = 2
 * @source Lukáš and Klesnil 1978 (from memory)
 * @example notchShortCrackFactor(mm(0.1), mm(2), mm(1)) // 4.0681081
 */
export function notchShortCrackFactor(length: Mm, across: Mm, along: Mm): number {
  const root = (along * along) / across;
  return (1.1215 * (1 + (2 * across) / along)) / Math.sqrt(1 + (4.5 * length) / root);
}

/**
 * Long cracks at both ends of an elliptical hole: the hole counts as crack, √(1 + A/c).
 * @param length crack length from the notch, c [mm]
 * @param across half axis of the hole along the crack, A [mm]
 * @returns factor F in K = F σ √(πc) [-]
 * @validity c large against the root radius; an upper estimate for short cracks
 * @source half crack length A + c in a wide plate
 * @example notchLongCrackFactor(mm(1), mm(3)) // 2
 */
export const notchLongCrackFactor = (length: Mm, across: Mm): number =>
  Math.sqrt(1 + across / length);
