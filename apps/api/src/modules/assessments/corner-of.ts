import type { AssessmentBasis } from './assessment-basis.repository';
import { cornerStress, type CornerStress } from './corner-stress';

type LoadCase = AssessmentBasis['loadCase'];

/** Least radius of a hole, against the wall, for which the solutions of a flaw at a hole hold. */
const LEAST_HOLE = 0.5;

/**
 * Whether the flaw is taken as one of the corner alone: at a nozzle, and at a hole so narrow against its wall
 * that the solutions for holes do not hold.
 */
export const startsFromCorner = (
  { kind, holeRadiusMm }: Pick<AssessmentBasis['location'], 'kind' | 'holeRadiusMm'>,
  thicknessMm: number,
): boolean =>
  kind === 'nozzle weld' || (holeRadiusMm !== null && holeRadiusMm < LEAST_HOLE * thicknessMm);

/** Stress of a load case at the nozzle corner the flaw starts from; null where it starts from none. */
export function cornerOf(
  { finding, location, component }: AssessmentBasis,
  load: LoadCase,
): CornerStress | null {
  const wall = finding.wallMm ?? component.wallMm;
  if (finding.kind !== 'corner' || location.holeRadiusMm === null) return null;
  if (!startsFromCorner(location, wall)) return null;
  const hoop = finding.orientation === 'axial';
  const [opening, across] = hoop
    ? [load.hoopMembraneMpa, load.axialMembraneMpa]
    : [load.axialMembraneMpa, load.hoopMembraneMpa];
  return cornerStress(opening, across, {
    holeRadiusMm: location.holeRadiusMm,
    thicknessMm: wall,
  });
}
