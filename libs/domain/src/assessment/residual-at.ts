import { heatTreatedResidual, relaxedResidual } from '../fracture/fad/residual-stress';
import type { FlawCase } from './flaw-case';

/** Residual stress that does not depend on the load [MPa]; zero where it does. */
export function fixedResidual({ residual, material }: FlawCase): {
  readonly membrane: number;
  readonly bending: number;
} {
  switch (residual.state) {
    case 'entered':
      return { membrane: residual.membraneMPa.value, bending: residual.bendingMPa.value };
    case 'heat-treated':
      return { membrane: heatTreatedResidual(residual.flawToWeld, material.yieldMPa), bending: 0 };
    default:
      return { membrane: 0, bending: 0 };
  }
}

/**
 * Residual membrane stress at a factor on the primary load [MPa]. An as-welded one is relaxed by the load
 * the flaw sees in service: a larger load that never came relaxes nothing more, a smaller one leaves more.
 */
export function residualMembraneAt(flaw: FlawCase, reference: number, factor: number): number {
  if (flaw.residual.state !== 'as-welded') return fixedResidual(flaw).membrane;
  const { yieldMPa, tensileMPa } = flaw.material;
  return relaxedResidual(Math.min(factor, 1) * reference, yieldMPa, tensileMPa);
}
