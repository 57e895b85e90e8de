import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'API 579-1 Annex 9C, plate, surface crack (from memory)';

/**
 * Relief of bending beside a surface crack: g = 1 − 20 (a/2c)^0.75 α³, α = (a/t)/(1 + t/c).
 * @param crack crack and wall: a, c, t [mm]
 * @returns relief g, not below 0 [-]
 * @validity a < t
 * @source API 579-1 equation 9C.32 (seen in a secondary source that cites it)
 * @example bendingRelief(crackOf({ a: 5, c: 15, t: 20 })) // 0.993583381368
 */
export function bendingRelief({ a, c, thickness }: Crack): number {
  const alpha = a / thickness / (1 + thickness / c);
  return Math.max(1 - 20 * (a / (2 * c)) ** 0.75 * alpha ** 3, 0);
}

/**
 * Reference stress of a surface crack in a plate by a second code: [g Pb + √((g Pb)² + 9 Pm² (1 − α)²)]/[3 (1 − α)²].
 * @param crack crack and wall: a, c, t [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity a < t; Pm ≥ 0, Pb taken without its sign
 * @source API 579-1 Annex 9C, plate, surface crack (from memory)
 * @example plateSurfaceApiReference(crackOf({ a: 5, c: 15, t: 20 }), mpa(120), mpa(80)) // 171.6845492658
 */
export function plateSurfaceApiReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness } = crack;
  const left = 1 - a / thickness / (1 + thickness / c);
  if (!(a < thickness)) return Number.POSITIVE_INFINITY as MPa;
  const pb = bendingRelief(crack) * Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * membrane * left)) / (3 * left * left)) as MPa;
}

export const PLATE_SURFACE_API_REFERENCE: ReferenceStressSolution = {
  key: 'plate-surface-api',
  title: 'Surface flaw in a plate, second form',
  source: SOURCE,
  formula: 'σref = [g Pb + √((g Pb)² + 9 Pm² (1 − α)²)]/[3 (1 − α)²], g = 1 − 20 (a/2c)^0.75 α³',
  basis: 'Local collapse of the ligament; g is an empirical relief of bending.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: plateSurfaceApiReference,
};
