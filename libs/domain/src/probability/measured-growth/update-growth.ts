import { refused, type Refused } from '../../geometry/refusal';
import { updateNormal, type Belief, type UpdatedBelief } from '../update/update-normal';
import { growthBetween, type MeasuredGrowth } from './growth-between';
import { growthOverFindings, type GrowthOverFindings } from './growth-over-findings';
import { refusalsOfFindings, type SizedFinding } from './sized-finding';

/** A growth rate as believed, as measured, and both together [mm/year]. */
export interface UpdatedGrowth {
  readonly status: 'updated';
  readonly measured: MeasuredGrowth | GrowthOverFindings;
  readonly rate: UpdatedBelief;
}

/**
 * Growth rate after all findings of a flaw. They enter together, as one line: neighbouring differences share
 * a sizing error, and taken one after the other they would count it twice.
 */
export function updateGrowth(
  prior: Belief,
  findings: readonly SizedFinding[],
): UpdatedGrowth | Refused {
  const [first, second] = findings;
  if (!first || !second) return refused(...refusalsOfFindings(findings, 2));
  const measured =
    findings.length === 2 ? growthBetween(first, second) : growthOverFindings(findings);
  if (measured.status === 'refused') return measured;
  const rate = updateNormal(prior, {
    mean: measured.rateMmPerYear,
    sd: measured.rateSdMmPerYear,
  });
  return rate.status === 'refused' ? rate : { status: 'updated', measured, rate };
}
