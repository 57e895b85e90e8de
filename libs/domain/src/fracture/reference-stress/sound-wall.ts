import type { MPa } from '../../units/quantity';

/**
 * Reference stress of a wall without a flaw: [Pb + √(Pb² + 9 Pm²)]/3, the section at collapse under force and
 * moment together.
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity rectangular section; Pm ≥ 0, Pb taken without its sign
 * @source limit analysis: M/Mp + (N/Np)² = 1
 * @example soundWall(mpa(100), mpa(100)) // 138.7425886723
 */
export function soundWall(membrane: MPa, bending: MPa): MPa {
  const pb = Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * membrane)) / 3) as MPa;
}

/**
 * Bending part of the collapse of a shell wall with a flaw of relative depth α beside which it holds:
 * 2 Pb/[3 (1 − α)²].
 * @param bending primary bending stress, Pb [MPa]
 * @param taken share of the wall the flaw takes, α [-]
 * @returns its part of the reference stress [MPa]
 * @validity α < 1; Pb taken without its sign
 * @source BS 7910 Annex P, cylinders (from memory)
 * @example shellBending(mpa(90), 0.4) // 166.66666667
 */
export const shellBending = (bending: MPa, taken: number): MPa =>
  ((2 * Math.abs(bending)) / (3 * (1 - taken) ** 2)) as MPa;
