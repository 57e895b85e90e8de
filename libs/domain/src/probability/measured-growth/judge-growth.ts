import { normalBelow, normalQuantile } from '../../numerics/normal-distribution';

/** What a measured rate means against its own error. */
export const GROWTH_FINDINGS = [
  'growth shown',
  'no measurable growth',
  'smaller beyond sizing error',
] as const;
export type GrowthFinding = (typeof GROWTH_FINDINGS)[number];

/** A rate with its error, and what it may be used for. */
export interface JudgedRate {
  /** As measured; below 0 when the later size is smaller [mm/year]. */
  readonly rateMmPerYear: number;
  readonly rateSdMmPerYear: number;
  /** Rate over its error. */
  readonly z: number;
  /** Chance of at least this rate were there no growth at all (one-sided). */
  readonly chanceWithoutGrowth: number;
  /** A flaw does not shrink: the rate, not below 0 [mm/year]. */
  readonly usedRateMmPerYear: number;
  /** One-sided 95 % upper rate, for life [mm/year]. */
  readonly upperRateMmPerYear: number;
  readonly finding: GrowthFinding;
  /** In words, for a person. */
  readonly words: string;
}

const CONFIDENCE = 0.95;
// a size smaller by more than two standard deviations asks for another explanation (common practice)
const SHRUNK = -2;

/** Judges a rate: real when chance alone would give as much in fewer than `level` of cases. */
export function judgeRate(rate: number, sd: number, level: number): JudgedRate {
  const z = rate / sd;
  const chance = normalBelow(-z);
  const finding: GrowthFinding =
    z < SHRUNK
      ? 'smaller beyond sizing error'
      : chance < level
        ? 'growth shown'
        : 'no measurable growth';
  const used = Math.max(rate, 0);
  // counted from no growth when the flaw seems to shrink: a sizing error must not shorten the upper rate
  const upper = used + normalQuantile(CONFIDENCE) * sd;
  return {
    rateMmPerYear: rate,
    rateSdMmPerYear: sd,
    z,
    chanceWithoutGrowth: chance,
    usedRateMmPerYear: used,
    upperRateMmPerYear: upper,
    finding,
    words: wordsOf(finding, rate, sd, z, upper),
  };
}

function wordsOf(
  finding: GrowthFinding,
  rate: number,
  sd: number,
  z: number,
  upper: number,
): string {
  const most = `upper 95 % ${upper.toFixed(2)} mm/year`;
  switch (finding) {
    case 'growth shown':
      return `Growth of ${rate.toFixed(2)} ± ${sd.toFixed(2)} mm/year, more than sizing error explains (z = ${z.toFixed(1)}); ${most}.`;
    case 'no measurable growth':
      return `No measurable growth: the change is explained by sizing error (z = ${z.toFixed(1)}); ${most}.`;
    case 'smaller beyond sizing error':
      return `Smaller than before by more than sizing error allows (z = ${z.toFixed(1)}): check that it is the same flaw, the same side, the technique and the calibration; ${most}.`;
  }
}
