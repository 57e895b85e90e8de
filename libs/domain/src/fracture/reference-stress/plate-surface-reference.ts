import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

/**
 * Share of the section a surface flaw takes out, spread over the wall beside it:
 * α″ = (a/B)/(1 + B/c), or (2a/B)(c/W) in a plate narrower than 2(c + B).
 * @param crack crack and wall: a, c, t, W [mm]
 * @returns area ratio α″ [-]
 * @validity a < B, 2c < W
 * @source BS 7910:2013 Annex P.6.1, as repeated in secondary sources (the standard itself: from memory)
 * @example surfaceAreaRatio(crackOf({ a: 5, c: 15, t: 20, W: 60 })) // 0.125
 */
export function surfaceAreaRatio({ a, c, thickness, width }: Crack): number {
  return width >= 2 * (c + thickness)
    ? a / thickness / (1 + thickness / c)
    : ((2 * a) / thickness) * (c / width);
}

/**
 * Reference stress of a surface flaw when the wall is held against bending (a vessel or pipe wall):
 * σref = [Pb + √(Pb² + 9 Pm² (1 − α″)²)] / [3 (1 − α″)²].
 * @param crack crack and wall: a, c, t, W [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity α″ < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.6.1, normal bending restraint (from memory; form seen in secondary sources)
 * @example plateSurfaceReference(crackOf({ a: 5, c: 15, t: 20, W: 500 }), mpa(120), mpa(80)) // 171.9508728
 */
export function plateSurfaceReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const left = 1 - surfaceAreaRatio(crack);
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  const pb = Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * membrane * left)) / (3 * left * left)) as MPa;
}

/**
 * Reference stress of a surface flaw in a wall that is free to bend (pinned loading): Pb is replaced by
 * Pb + 3 Pm α″ in the form for a held wall.
 * @param crack crack and wall: a, c, t, W [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity α″ < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.6.1, negligible bending restraint (from memory; form seen in secondary sources)
 * @example plateSurfaceReferencePinned(crackOf({ a: 5, c: 15, t: 20, W: 500 }), mpa(100), mpa(0)) // 126.2435177
 */
export function plateSurfaceReferencePinned(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const shifted = Math.abs(bending) + 3 * membrane * surfaceAreaRatio(crack);
  return plateSurfaceReference(crack, membrane, shifted as MPa);
}

export const PLATE_SURFACE_REFERENCE: ReferenceStressSolution = {
  key: 'plate-surface-held',
  title: 'Surface flaw, wall held against bending',
  source: 'BS 7910:2013 Annex P.6.1, normal bending restraint (from memory)',
  formula: 'σref = [Pb + √(Pb² + 9 Pm² (1 − α″)²)] / [3 (1 − α″)²], α″ = (a/t)/(1 + t/c)',
  basis: 'Local collapse of the ligament; the wall beside the flaw holds it against bending.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: plateSurfaceReference,
};
