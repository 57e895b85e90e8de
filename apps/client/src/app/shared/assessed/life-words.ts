import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { RemainingLife } from '@ligament/domain/assessment/assessment-outcome';
import { numberText } from '../quantity/quantity-text';

/** Longest life ever shown as a figure [years]; common practice. */
const LONGEST_SHOWN = 40;

/** A remaining life as a figure and its unit; a life that was not seen to end is never a figure. */
export function lifeWords({ years, end }: RemainingLife): { value: string; unit: string } {
  if (years === null) return { value: 'none', unit: '' };
  if (end === 'no growth') return { value: 'no growth', unit: 'predicted' };
  if (end === 'horizon' || years > LONGEST_SHOWN) {
    return { value: `over ${numberText(Math.min(years, LONGEST_SHOWN), 0)}`, unit: 'years' };
  }
  return { value: numberText(years, years < 10 ? 2 : 1), unit: 'years' };
}

/** The life the flaw would have at the size that was measured: how much of it hangs on the sizing. */
export function lifeAtMeasuredSize(input: AssessmentInput): RemainingLife | null {
  const { heightAllowanceMm, lengthAllowanceMm } = input.sizing;
  if (heightAllowanceMm.value === 0 && lengthAllowanceMm.value === 0) return null;
  const outcome = assessFlaw({
    ...input,
    sizing: {
      heightAllowanceMm: { ...heightAllowanceMm, value: 0 },
      lengthAllowanceMm: { ...lengthAllowanceMm, value: 0 },
    },
  });
  return outcome.status === 'assessed' ? outcome.life : null;
}
