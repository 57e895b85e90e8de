import type { AssessmentInput } from './assessment-input';
import type { AssessedFlaw, AssessmentOutcome } from './assessment-outcome';
import { calculationSheet } from './calculation-sheet';
import { cautions } from './cautions';
import type { CharacterisedFlaw } from './characterise';
import { validityChecks } from './check-validity';
import { describeStanding } from './describe-standing';
import { driversOf } from './drivers';
import { ENGINE_VERSION } from './engine-version';
import { followGrowth } from './follow-growth';
import { cyclesPerYear, stateOf } from './growth-states';
import { limitingSize } from './limiting-size';
import { listAssumed } from './list-assumed';
import { NO_LIFE, remainingLife } from './remaining-life';
import { prepareCase } from './prepare-case';
import type { Section } from './section';
import { standing } from './standing';
import { judge } from './verdict';

export { ENGINE_VERSION } from './engine-version';

/**
 * Assesses one flaw: verdict, reserves, limiting size, growth and remaining life, with the calculation
 * sheet, or a refusal that names input, limit and value. Pure: the same input gives the same answer.
 */
export function assessFlaw(input: AssessmentInput): AssessmentOutcome {
  const prepared = prepareCase(input);
  return prepared.status === 'refused'
    ? prepared
    : assessed(input, prepared.flaw, prepared.section);
}

function assessed(
  input: AssessmentInput,
  flaw: CharacterisedFlaw,
  section: Section,
): AssessmentOutcome {
  const limiting = limitingSize(section, flaw);
  const point = standing(section, flaw);
  const { path, events, life } = growthOf(input, flaw, section, point.reserveOnLoad >= 1);
  const verdict = judge({
    ...point,
    lrMax: section.evaluator.lrMax,
    heightMm: flaw.height,
    limitingHeightMm: limiting.heightMm,
    allowanceMm: input.sizing.heightAllowanceMm.value,
  });
  const checks = validityChecks(section.limits, section.crackAt(flaw.a, flaw.c));
  const assumed = listAssumed(input);
  return {
    status: 'assessed',
    engineVersion: ENGINE_VERSION,
    ...verdict,
    ...describeStanding(section, flaw, point),
    limitingHeightMm: limiting.heightMm,
    limitingLengthMm: limiting.lengthMm,
    limitingBecause: limiting.because,
    path,
    events,
    life,
    checks,
    cautions: cautions({ input, flaw, section, point, assumed, checks }),
    assumed,
    sheet: calculationSheet({ input, flaw, section, point, limiting, life }),
  };
}

/** Growth and life of an acceptable flaw; one that is not acceptable has neither. */
function growthOf(
  input: AssessmentInput,
  flaw: CharacterisedFlaw,
  section: Section,
  acceptable: boolean,
): Pick<AssessedFlaw, 'path' | 'events' | 'life'> {
  const drivers = driversOf(input);
  if (!acceptable) {
    const now = stateOf(section, { years: 0, a: flaw.a, c: flaw.c }, 0, cyclesPerYear(drivers));
    return { path: [now], events: [], life: NO_LIFE };
  }
  const history = followGrowth(section.flaw, flaw, drivers, input.horizonYears);
  const { path, events } = history;
  return { path, events, life: remainingLife(history, cyclesPerYear(drivers)) };
}
