import { normalBelow, normalQuantile } from '../numerics/normal-distribution';
import { logSdOfCov } from './distributions/lognormal-scatter';

/**
 * Reliability index of a failure probability: β = −Φ⁻¹(Pf).
 * @param failureProbability probability of failure, Pf [-]
 * @returns reliability index, β [-]
 * @validity 0 < Pf < 1
 * @source definition; JCSS Probabilistic Model Code Part 1, Annex C
 * @example reliabilityIndex(1e-5) // 4.2648907939
 */
export const reliabilityIndex = (failureProbability: number): number =>
  -normalQuantile(failureProbability);

/**
 * Failure probability of a reliability index: Pf = Φ(−β).
 * @param beta reliability index, β [-]
 * @returns probability of failure, Pf [-]
 * @validity any real β
 * @source definition; JCSS Probabilistic Model Code Part 1, Annex C
 * @example failureProbabilityOf(2.77350098113) // 0.0027728336576
 */
export const failureProbabilityOf = (beta: number): number => normalBelow(-beta);

/** Mean and scatter of a normal variable. */
export interface NormalPair {
  readonly mean: number;
  readonly sd: number;
}

/** Mean and relative scatter of a lognormal variable. */
export interface LognormalPair {
  readonly mean: number;
  readonly cov: number;
}

/**
 * Reliability index of resistance against load, both normal: (μR − μS)/√(σR² + σS²).
 * @param resistance mean and standard deviation of R [unit of R]
 * @param load mean and standard deviation of S, same unit [unit of R]
 * @returns reliability index, β; exact [-]
 * @validity independent, not both without scatter
 * @source linear limit state of normal variables, closed form
 * @example normalIndex({ mean: 100, sd: 15 }, { mean: 50, sd: 10 }) // 2.7735009811
 */
export const normalIndex = (resistance: NormalPair, load: NormalPair): number =>
  (resistance.mean - load.mean) / Math.hypot(resistance.sd, load.sd);

/**
 * Reliability index of resistance against load, both lognormal: the logarithms are normal, so
 * β = [ln(μR/μS) − (ζR² − ζS²)/2]/√(ζR² + ζS²) with ζ² = ln(1 + V²).
 * @param resistance mean and coefficient of variation of R [unit of R]
 * @param load mean and coefficient of variation of S, same unit [unit of R]
 * @returns reliability index, β; exact [-]
 * @validity independent, means above 0, not both without scatter
 * @source linear limit state of the logarithms, closed form
 * @example lognormalIndex({ mean: 120, cov: 0.2 }, { mean: 70, cov: 0.15 }) // 2.1397275757
 */
export function lognormalIndex(resistance: LognormalPair, load: LognormalPair): number {
  const [r, s] = [logSdOfCov(resistance.cov), logSdOfCov(load.cov)];
  const medians = Math.log(resistance.mean / load.mean) - (r * r - s * s) / 2;
  return medians / Math.hypot(r, s);
}
