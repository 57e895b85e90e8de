import { heatTreatedResidual, proofTestedResidual } from '../fracture/fad/residual-stress';
import { linearTerms, termsOf, type StressTerms } from '../fracture/stress-intensity/stress-terms';
import type { FlawCase } from './flaw-case';

/** Residual stress that does not depend on the load [MPa]; zero where it does. */
export function fixedResidual({ residual, material }: FlawCase): StressTerms {
  switch (residual.state) {
    case 'entered':
      return linearTerms(residual.membraneMPa.value, residual.bendingMPa.value);
    case 'profile':
      return termsOf(residual.profileMPa.value);
    case 'heat-treated':
      return linearTerms(heatTreatedResidual(residual.flawToWeld, material.yieldMPa), 0);
    default:
      return linearTerms(0, 0);
  }
}

/**
 * Reference stress of the proof test in the wall without a flaw: [Pb + √(Pb² + 9 Pm²)]/3. The flaw of that
 * day is not known, and without it the relaxation is the least.
 */
const uncrackedReference = (membrane: number, bending: number): number =>
  (Math.abs(bending) + Math.hypot(bending, 3 * membrane)) / 3;

/** Whether the load relaxes the residual stress, so that it depends on the flaw. */
export const isRelaxedByLoad = ({ residual: { state } }: FlawCase): boolean =>
  state === 'as-welded' || state === 'proof-tested';

/**
 * Residual membrane stress of a weld at a factor on the primary load [MPa]. It is relaxed by the load the
 * flaw sees in service, or by a proof test: a larger load that never came relaxes nothing more, a smaller one
 * leaves more.
 */
export function relaxedResidualAt(flaw: FlawCase, reference: number, factor: number): number {
  const { residual, material } = flaw;
  return proofTestedResidual({
    proofReference:
      residual.state === 'proof-tested'
        ? uncrackedReference(residual.membraneMPa.value, residual.bendingMPa.value)
        : 0,
    serviceReference: Math.min(factor, 1) * reference,
    yieldMPa: material.yieldMPa,
    tensileMPa: material.tensileMPa,
  });
}
