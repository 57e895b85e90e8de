import type { AssessmentBasis } from './assessment-basis.repository';
import { cornerStress, type CornerStress } from './corner-stress';

type LoadCase = AssessmentBasis['loadCase'];

/** Stress of a load case at the nozzle corner the flaw starts from; null where it starts from none. */
export function cornerOf(
  { finding, location, component }: AssessmentBasis,
  load: LoadCase,
): CornerStress | null {
  if (finding.kind !== 'corner' || location.kind !== 'nozzle weld') return null;
  if (location.holeRadiusMm === null) return null;
  const hoop = finding.orientation === 'axial';
  const [opening, across] = hoop
    ? [load.hoopMembraneMpa, load.axialMembraneMpa]
    : [load.axialMembraneMpa, load.hoopMembraneMpa];
  return cornerStress(opening, across, {
    holeRadiusMm: location.holeRadiusMm,
    thicknessMm: finding.wallMm ?? component.wallMm,
  });
}
