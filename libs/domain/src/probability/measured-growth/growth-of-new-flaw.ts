import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { refusalsOfFindings, type SizedFinding } from './sized-finding';

/** What the growth of a flaw can be that an earlier inspection did not report. */
export interface GrowthOfNewFlaw {
  readonly status: 'bounded';
  /** From the size that would just not have been reported to the size found, not below 0 [mm/year]. */
  readonly leastRateMmPerYear: number;
  /** From nothing to the size found: the most the size allows [mm/year]. */
  readonly mostRateMmPerYear: number;
  /** In words, for a person. */
  readonly words: string;
}

/**
 * Bounds of the growth of a flaw first reported now: below its reporting threshold the earlier inspection
 * would have recorded nothing, so a new flaw is no proof of fast growth. It may also have been missed.
 */
export function growthOfNewFlaw(
  finding: SizedFinding,
  earlier: { readonly years: number; readonly reportedFromMm: number },
): GrowthOfNewFlaw | Refused {
  const refusals = [
    ...refusalsOfFindings([finding], 1),
    ...outOfBounds([
      {
        input: 'earlier.reportedFromMm',
        name: 'Reporting threshold',
        unit: 'mm',
        value: earlier.reportedFromMm,
        min: 0,
        max: 1000,
        instead: 'Give the smallest size the earlier inspection reported, in millimetres.',
      },
      {
        input: 'earlier.years',
        name: 'Time since the earlier inspection',
        unit: 'years',
        value: finding.years - earlier.years,
        min: 0,
        max: 200,
        above: true,
        instead: 'Give the earlier inspection first.',
      },
    ]),
  ];
  if (refusals.length > 0) return refused(...refusals);
  const years = finding.years - earlier.years;
  const least = Math.max(finding.sizeMm - earlier.reportedFromMm, 0) / years;
  const most = finding.sizeMm / years;
  return {
    status: 'bounded',
    leastRateMmPerYear: least,
    mostRateMmPerYear: most,
    words: `Not reported before, when flaws from ${earlier.reportedFromMm} mm were: unless it was missed, it grew at ${least.toFixed(2)} to ${most.toFixed(2)} mm/year.`,
  };
}
