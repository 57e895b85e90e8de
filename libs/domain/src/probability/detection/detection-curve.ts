import { normalBelow, normalQuantile } from '../../numerics/normal-distribution';

/** The forms a probability of detection against size may take, both over the logarithm of the size. */
export const DETECTION_FORMS = ['log-logistic', 'lognormal'] as const;
export type DetectionForm = (typeof DETECTION_FORMS)[number];

/** Probability of detection against size: the size found half the time, and the spread over ln a. */
export interface DetectionCurve {
  readonly form: DetectionForm;
  /** Size found with probability 0.5, a50 [mm]. */
  readonly a50Mm: number;
  /** Standard deviation over ln a [-]. */
  readonly spread: number;
}

// a logistic variable of scale 1 has the standard deviation π/√3
const LOGISTIC_SD = Math.PI / Math.sqrt(3);

/**
 * Probability of detection: 1/(1 + exp(−(π/√3)(ln a − ln a50)/s)) or Φ((ln a − ln a50)/s).
 * @param curve form, a50 and spread s [-, mm, -]
 * @param size size of the flaw, a [mm]
 * @returns probability of detection [-]
 * @validity a50 and s above 0; 0 for no size
 * @source Berens, ASM Handbook 17 (1989), hit/miss forms (from memory)
 * @example detectionProbability({ form: 'log-logistic', a50Mm: 3, spread: 0.5 }, 3) // 0.5
 */
export function detectionProbability(
  { form, a50Mm, spread }: DetectionCurve,
  size: number,
): number {
  if (!(size > 0)) return 0;
  const x = Math.log(size / a50Mm) / spread;
  return form === 'lognormal' ? normalBelow(x) : 1 / (1 + Math.exp(-LOGISTIC_SD * x));
}

/**
 * Size found with a given probability: a50 (p/(1 − p))^(s √3/π), or a50 exp(s Φ⁻¹(p)).
 * @param curve form, a50 and spread s [-, mm, -]
 * @param probability probability of detection, p [-]
 * @returns size, a [mm]
 * @validity 0 < p < 1
 * @source inverse of the forms of Berens, ASM Handbook 17 (1989) (from memory)
 * @example sizeDetectedWith({ form: 'log-logistic', a50Mm: 3, spread: 0.5 }, 0.9) // 5.497585458
 */
export function sizeDetectedWith(
  { form, a50Mm, spread }: DetectionCurve,
  probability: number,
): number {
  const x =
    form === 'lognormal'
      ? normalQuantile(probability)
      : Math.log(probability / (1 - probability)) / LOGISTIC_SD;
  return a50Mm * Math.exp(spread * x);
}

/**
 * Probability that at least one of several inspections finds the flaw: 1 − Π(1 − POD).
 * @param probabilities probability of detection of each inspection [-]
 * @returns probability of at least one detection [-]
 * @validity independent inspections; the same procedure twice is less than that, so the value is optimistic
 * @source total probability of independent events
 * @example detectedAtLeastOnce([0.5, 0.8]) // 0.9
 */
export const detectedAtLeastOnce = (probabilities: readonly number[]): number =>
  1 - probabilities.reduce((missed, each) => missed * (1 - each), 1);
