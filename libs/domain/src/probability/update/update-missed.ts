import { outOfBounds, refused, type Refused } from '../../geometry/refusal';

/** What is known of a flaw after an inspection that found none. */
export interface MissedFlaw {
  readonly status: 'updated';
  /** Mean of the exponential size, were there a flaw [mm]. */
  readonly meanSizeMm: number;
  /** Probability of finding nothing, were there a flaw. */
  readonly notFound: number;
}

/**
 * Size of a possible flaw after it was not found: an exponential size of mean m, looked for with
 * POD = 1 − exp(−a/L), is exponential with mean m L/(m + L) afterwards, and is not found with probability
 * L/(m + L). Closed form of Bayes' rule.
 */
export function updateMissedSize(
  meanSizeMm: number,
  detectionScaleMm: number,
): MissedFlaw | Refused {
  const refusals = outOfBounds([
    size('meanSizeMm', 'Mean size before the inspection', meanSizeMm),
    size('detectionScaleMm', 'Scale of the detection curve', detectionScaleMm),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const share = detectionScaleMm / (meanSizeMm + detectionScaleMm);
  return { status: 'updated', meanSizeMm: meanSizeMm * share, notFound: share };
}

const size = (input: string, name: string, value: number) => ({
  input,
  name,
  unit: 'mm',
  value,
  min: 0,
  max: 1000,
  above: true,
  instead: 'Give it in millimetres.',
});
