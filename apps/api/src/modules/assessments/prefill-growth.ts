import type { CycleBlockInput, GrowthInput } from '@ligament/domain/assessment/assessment-input';
import { daysBetween } from '@ligament/domain/scheduling/calendar-date';
import type { Given } from '@ligament/domain/units/provenance';
import { cornerOf } from './corner-of';
import type { AssessmentBasis } from './assessment-basis.repository';

const DAYS_PER_YEAR = 365.25;
/** One-sided 95 % of a normal distribution. */
const UPPER_95 = 1.645;
/** Used until a rate has been measured; it has no source and is marked as assumed [mm/year]. */
const UNMEASURED_RATE = 1;

/** What makes the flaw grow: the operating cycles by the chosen law, and stress corrosion at its measured rate. */
export function prefillGrowth(basis: AssessmentBasis): GrowthInput {
  const blocks = blocksOf(basis);
  return {
    fatigue: basis.growthLaw && blocks.length > 0 ? { law: lawOf(basis.growthLaw), blocks } : null,
    stressCorrosion: basis.flaw.mechanism === 'stress corrosion cracking' ? ratesOf(basis) : null,
  };
}

function lawOf({
  key,
  title,
  source,
  stages,
  thresholdMpaSqrtMm,
}: NonNullable<AssessmentBasis['growthLaw']>) {
  return { key, title, source, stages, thresholdMPaSqrtMm: thresholdMpaSqrtMm };
}

function blocksOf(basis: AssessmentBasis): CycleBlockInput[] {
  const { cycles, loadCases, finding } = basis;
  return cycles.flatMap((cycle) => {
    const load = loadCases.find(({ id }) => id === cycle.loadCaseId);
    if (!load) return [];
    const hoop = finding.orientation === 'axial';
    const corner = cornerOf(basis, load);
    const membrane = corner?.membraneMPa ?? (hoop ? load.hoopMembraneMpa : load.axialMembraneMpa);
    const bending = corner?.bendingMPa ?? (hoop ? load.hoopBendingMpa : load.axialBendingMpa);
    return [
      {
        membraneRangeMPa: Math.abs(membrane) * cycle.rangeFraction,
        bendingRangeMPa: bending * cycle.rangeFraction,
        cyclesPerYear: cycle.countPerYear,
        note: `${cycle.name}${cycle.source ? `, ${cycle.source}` : ''}`,
      },
    ];
  });
}

/** Rate between the first and the newest finding, at its upper 95 % bound for the sizing errors of both. */
function ratesOf({
  finding,
  earlier,
}: AssessmentBasis): NonNullable<GrowthInput['stressCorrosion']> {
  const first = earlier.at(-1);
  const years = first ? daysBetween(first.inspectedOn, finding.inspectedOn) / DAYS_PER_YEAR : 0;
  if (!first || years < 0.5) {
    const assumed: Given = {
      value: UNMEASURED_RATE,
      provenance: 'assumed',
      note: 'No rate measured yet: enter the plant’s own, or one a corrosion specialist gives',
    };
    return { depthRateMmPerYear: assumed, endRateMmPerYear: assumed };
  }
  const upper = (change: number, errors: number, note: string): Given => ({
    value: Math.round((Math.max(0, change) + UPPER_95 * errors) * (100 / years)) / 100,
    provenance: 'measured',
    note,
  });
  const span = `Findings of ${first.inspectedOn} and ${finding.inspectedOn}, upper 95 % bound for the sizing errors`;
  return {
    depthRateMmPerYear: upper(
      finding.heightMm - first.heightMm,
      Math.hypot(finding.heightErrorMm, first.heightErrorMm),
      span,
    ),
    endRateMmPerYear: upper(
      (finding.lengthMm - first.lengthMm) / 2,
      Math.hypot(finding.lengthErrorMm, first.lengthErrorMm) / 2,
      `${span}; half of the length at each end`,
    ),
  };
}
