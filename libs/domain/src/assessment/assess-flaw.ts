import { optionOneLine } from '../fracture/fad/option-one-line';
import { toMPaSqrtM } from '../units/convert';
import type { AssessmentInput } from './assessment-input';
import type { AssessmentOutcome, Refusal } from './assessment-outcome';
import { calculationSheet } from './calculation-sheet';
import { cautions } from './cautions';
import { characterise, type CharacterisedFlaw } from './characterise';
import { checkInput } from './check-input';
import { validityChecks, validityRefusals } from './check-validity';
import { driversOf } from './drivers';
import { ENGINE_VERSION } from './engine-version';
import { flawCase } from './flaw-case';
import { followGrowth } from './follow-growth';
import { cyclesPerYear, stateOf } from './growth-states';
import { limitingSize } from './limiting-size';
import { listAssumed } from './list-assumed';
import { NO_LIFE, remainingLife } from './remaining-life';
import { sectionOf, type Section } from './section';
import { standing } from './standing';
import { judge } from './verdict';

export { ENGINE_VERSION } from './engine-version';

/**
 * Assesses one flaw: verdict, reserves, limiting size, growth and remaining life, with the calculation
 * sheet, or a refusal that names input, limit and value. Pure: the same input gives the same answer.
 */
export function assessFlaw(input: AssessmentInput): AssessmentOutcome {
  const impossible = checkInput(input);
  if (impossible.length > 0) return refused(impossible);
  const flaw = characterise(input);
  const section = sectionOf(flawCase(input), flaw);
  const crack = section.crackAt(flaw.a, flaw.c);
  const outside = validityRefusals(section.limits, crack);
  return outside.length > 0 ? refused(outside) : assessed(input, flaw, section);
}

const refused = (refusals: readonly Refusal[]): AssessmentOutcome => ({
  status: 'refused',
  engineVersion: ENGINE_VERSION,
  refusals,
});

function assessed(
  input: AssessmentInput,
  flaw: CharacterisedFlaw,
  section: Section,
): AssessmentOutcome {
  const { evaluator } = section;
  const limiting = limitingSize(section, flaw);
  const point = standing(section, flaw);
  const verdict = judge({
    ...point,
    lrMax: evaluator.lrMax,
    heightMm: flaw.height,
    limitingHeightMm: limiting.heightMm,
    allowanceMm: input.sizing.heightAllowanceMm.value,
  });
  const drivers = driversOf(input);
  const history =
    point.reserveOnLoad < 1 ? null : followGrowth(section.flaw, flaw, drivers, input.horizonYears);
  const life = history ? remainingLife(history, cyclesPerYear(drivers)) : NO_LIFE;
  const checks = validityChecks(section.limits, section.crackAt(flaw.a, flaw.c));
  const assumed = listAssumed(input);
  const { kPrimary, kSecondary } = point.at;
  const { stressIntensity, referenceStress } = evaluator.solutions;
  return {
    status: 'assessed',
    engineVersion: ENGINE_VERSION,
    ...verdict,
    assessed: {
      heightMm: flaw.height,
      aMm: flaw.a,
      cMm: flaw.c,
      ligamentMm: section.ligament(flaw.a),
    },
    solution: { stressIntensity: stressIntensity.title, referenceStress: referenceStress.title },
    residualMembraneMPa: point.residualMembrane,
    residualBendingMPa: point.residualBending,
    referenceStressMPa: point.referenceStress,
    front: point.front,
    governingAngleDeg: point.angle,
    kPrimaryMPaSqrtM: toMPaSqrtM(kPrimary),
    kSecondaryMPaSqrtM: toMPaSqrtM(kSecondary),
    kr: point.kr,
    lr: point.lr,
    lrMax: evaluator.lrMax,
    line: optionOneLine(section.flaw.material),
    reserveOnLoad: point.reserveOnLoad,
    reserveOnToughness: point.reserveOnToughness,
    limitingHeightMm: limiting.heightMm,
    limitingBecause: limiting.because,
    path: history?.path ?? [stateOf(section, { years: 0, a: flaw.a, c: flaw.c }, 0, 0)],
    events: history?.events ?? [],
    life,
    checks,
    cautions: cautions({
      input,
      flaw,
      section,
      kTotal: kPrimary + kSecondary,
      kPrimary,
      kSecondary,
      lr: point.lr,
      assumed,
      checks,
    }),
    assumed,
    sheet: calculationSheet({ input, flaw, section, point, limiting, life }),
  };
}
