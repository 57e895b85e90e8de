import type { Crack } from '../../geometry/crack';
import { heldStripFactor, shellRestraint } from './held-strip';
import type { LongCrackFit } from './long-crack-fit';
import type { FaceDegree } from './strip-coefficient';

/**
 * Length of strip that turns as easily as a ring that is cut once: L/t = (2π/3) R/t, R the mean radius; the ring's
 * own hoop force keeps the cut from shifting.
 * @param ratio inside radius over thickness, Ri/t [-]
 * @returns L/t for `heldStripFactor` [-]
 * @validity thin ring; with it the held strip is within 0.4 % of long axial cracks at Ri/t = 100, 6 % at 5
 * @source bending of a thin circular ring (Castigliano)
 * @example ringRestraint(10) // 21.99114858
 */
export const ringRestraint = (ratio: number): number => ((2 * Math.PI) / 3) * (ratio + 0.5);

/** Which way a long crack runs: along the cylinder its ring holds it, around it the shell. */
export type LongWay = 'axial' | 'circumferential';

/**
 * Crack without ends in the wall of a cylinder, stress σn (x/t)ⁿ on its faces, x from the flawed face: H in
 * K = σn H √(πa). The strip held by the wall, times a smooth correction; exactly the free strip for a plate and
 * the half-plane for a shallow crack.
 * @param degree n of the stress [-]
 * @param crack crack and wall: a, t, Ri [mm]
 * @param way along the cylinder or around it [-]
 * @param fit coefficients of the correction [-]
 * @returns factor H = (a/t)ⁿ Gn [-]
 * @validity Ri/t ≥ 1, a/t ≤ 0.8
 * @source own fit of finite-element results, within 0.2 %; left out of the fit, a radius of Ri/t ≥ 5 is met within 0.5 %
 * @example longCrackFactor(0, crackOf({ a: 4, c: 1, t: 10 }), 'axial', []) // 2.111705781
 */
export function longCrackFactor(
  degree: FaceDegree,
  crack: Crack,
  way: LongWay,
  fit: LongCrackFit,
): number {
  const alpha = Math.min(crack.a / crack.thickness, 0.9);
  const ratio = crack.insideRadius / crack.thickness;
  const restraint = way === 'axial' ? ringRestraint(ratio) : shellRestraint(ratio);
  return (
    heldStripFactor(degree, alpha, restraint) *
    (1 + correction(fit[degree], 1 / (ratio + 2), alpha))
  );
}

/** Σ c uⁱ αʲ, i = 1…3, j = 1…4. */
function correction(row: readonly number[] | undefined, u: number, alpha: number): number {
  if (!row) return 0;
  let sum = 0;
  for (let i = 2; i >= 0; i--) {
    let inner = 0;
    for (let j = 3; j >= 0; j--) inner = (inner + (row[4 * i + j] ?? 0)) * alpha;
    sum = (sum + inner) * u;
  }
  return sum;
}
