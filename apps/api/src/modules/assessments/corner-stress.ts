import { holeLigament } from '@ligament/domain/fracture/stress-raisers/hole-ligament';

/** Stress across the corner of a nozzle, as membrane and bending through the wall. */
export interface CornerStress {
  readonly membraneMPa: number;
  /** Positive when the corner is in tension. */
  readonly bendingMPa: number;
  readonly peakFactor: number;
}

/** Depth over which the stress is fitted: the range of the solution for a nozzle corner, half of the wall. */
const FITTED_SHARE = 0.5;

/**
 * Stress at the corner of a nozzle as at a hole of its bore in a flat plate (Kirsch 1898): the stress that
 * opens the flaw, with the stress across it. Reinforcement by the nozzle is left out, which is cautious; the
 * bend of the shell is too, so an analysis of the nozzle goes before it. Null where the hole has no such field.
 */
export function cornerStress(
  opening: number,
  across: number,
  wall: { readonly holeRadiusMm: number; readonly thicknessMm: number },
): CornerStress | null {
  if (!(opening > 0)) return null;
  const ratio = Math.max(-1, Math.min(across / opening, 1));
  const length = FITTED_SHARE * wall.thicknessMm;
  const fit = holeLigament(
    { radiusMm: wall.holeRadiusMm, stressMPa: opening, ratio, pressureMPa: 0 },
    length,
  );
  if (fit.status === 'refused') return null;
  // the line through the fitted part, read over the whole wall
  const bendingMPa = fit.bending / FITTED_SHARE;
  return {
    membraneMPa: fit.membrane + fit.bending - bendingMPa,
    bendingMPa,
    peakFactor: fit.peakFactor,
  };
}
