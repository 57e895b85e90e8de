import type { ResidualStressInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentBasis } from './assessment-basis.repository';

/** Residual stress by the state of the weld; an unknown state counts as as-welded. */
export function prefillResidual({
  component,
  location,
  finding,
}: AssessmentBasis): ResidualStressInput {
  if (location.kind === 'plain zone') return { state: 'none' };
  const treatment = location.heatTreatment ?? component.heatTreatment;
  if (treatment !== 'post-weld heat treated') return { state: 'as-welded' };
  const alongWeld =
    (location.kind === 'longitudinal weld' && finding.orientation === 'axial') ||
    (location.kind === 'circumferential weld' && finding.orientation === 'circumferential') ||
    location.kind === 'attachment weld' ||
    location.kind === 'nozzle weld';
  return { state: 'heat-treated', flawToWeld: alongWeld ? 'parallel' : 'transverse' };
}
