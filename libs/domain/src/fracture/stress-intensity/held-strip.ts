import { edgeBendingFactor } from './edge-crack';
import { integralTo, runningIntegral } from './running-integral';
import { stripCoefficient, type FaceDegree } from './strip-coefficient';

const DEEPEST = 0.9;
const STEPS = 180;

/** ∫ xⁿ⁺¹ Gn Fb dx per degree: how far a stress (x/t)ⁿ turns the strip about its crack. */
const TURNING = ([0, 1, 2, 3, 4] as const).map((n) =>
  runningIntegral(
    (x) => x ** (n + 1) * stripCoefficient(n, x) * edgeBendingFactor(x),
    DEEPEST,
    STEPS,
  ),
);
/** ∫ x Fb² dx: how far bending turns it. */
const YIELDING = runningIntegral((x) => x * edgeBendingFactor(x) ** 2, DEEPEST, STEPS);

const turning = (degree: FaceDegree, alpha: number): number => {
  const running = TURNING[degree];
  return running ? integralTo(running, alpha) : 0;
};

/**
 * Edge crack in a strip whose ends cannot turn, stress σn (x/t)ⁿ on its faces: H in K = σn H √(πa). The crack
 * turns the strip; a bending moment turns it back. Both angles follow from the energy released (Castigliano):
 * σb = −6π σn ∫xⁿ⁺¹ Gn Fb dx/(6π ∫x Fb² dx + L/t).
 * @param degree n of the stress [-]
 * @param alpha crack depth over thickness, α [-]
 * @param restraint length of strip between the ends that cannot turn, over its thickness, L/t [-]
 * @returns factor H = αⁿ Gn less the share of the moment [-]
 * @validity α ≤ 0.9; L/t → ∞ is the free strip
 * @source superposition of own finite-element fits, exact for a beam-like strip (L/t above about 3)
 * @example heldStripFactor(0, 0.5, 1e9) // 2.823545
 */
export function heldStripFactor(degree: FaceDegree, alpha: number, restraint: number): number {
  const depth = Math.min(alpha, DEEPEST);
  const moment =
    (6 * Math.PI * turning(degree, depth)) /
    (6 * Math.PI * integralTo(YIELDING, depth) + restraint);
  return depth ** degree * stripCoefficient(degree, depth) - moment * edgeBendingFactor(depth);
}

/**
 * The same for bending 1 − 2x/t of the uncracked strip: only the share that the crack does not shed is left.
 * @param alpha crack depth over thickness, α [-]
 * @param restraint length of strip between the ends that cannot turn, over its thickness, L/t [-]
 * @returns factor F in K = σb F √(πa) [-]
 * @validity α ≤ 0.9; L/t → ∞ is the free strip
 * @source superposition of own finite-element fits, exact for a beam-like strip (L/t above about 3)
 * @example heldStripBending(0.4, 1e9) // 1.260795
 */
export function heldStripBending(alpha: number, restraint: number): number {
  const depth = Math.min(alpha, DEEPEST);
  const shed = 6 * Math.PI * integralTo(YIELDING, depth);
  return (edgeBendingFactor(depth) * restraint) / (shed + restraint);
}

/**
 * Length of strip that turns as easily as the wall of a cylinder does about a crack around it:
 * L/t = 2√(R/t)/[3(1 − ν²)]^¼, R the mean radius, ν = 0.3; the bending of a long shell by an edge moment.
 * @param ratio inside radius over thickness, Ri/t [-]
 * @returns L/t for `heldStripFactor` [-]
 * @validity thin wall; with it the held strip is 0.1–0.3 % above full-circumference cracks at Ri/t = 100, 1–3 % at 10
 * @source Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, bending of a long cylindrical shell
 * @example shellRestraint(100) // 15.59812387
 */
export const shellRestraint = (ratio: number): number =>
  (2 * Math.sqrt(ratio + 0.5)) / (3 * (1 - 0.3 ** 2)) ** 0.25;
