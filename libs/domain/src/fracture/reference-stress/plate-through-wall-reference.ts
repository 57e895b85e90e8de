import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';
import { soundWall } from './sound-wall';

const SOURCE = 'BS 7910:2013 Annex P.5.1 (from memory; form seen in a secondary source)';

/**
 * Reference stress of a crack through a plate: [Pb + √(Pb² + 9 Pm²)]/[3 (1 − 2c/W)].
 * @param crack crack and wall: c, W [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref; Infinity once the plate is cut through [MPa]
 * @validity 2c < W; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.5.1 (from memory; form seen in a secondary source)
 * @example plateThroughWallReference(crackOf({ a: 20, c: 20, t: 20, W: 200 }), mpa(100), mpa(0)) // 125
 */
export function plateThroughWallReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const left = 1 - (2 * crack.c) / crack.width;
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  return (soundWall(membrane, bending) / left) as MPa;
}

export const PLATE_THROUGH_WALL_REFERENCE: ReferenceStressSolution = {
  key: 'plate-through-wall',
  title: 'Crack through a plate',
  source: SOURCE,
  formula: 'σref = [Pb + √(Pb² + 9 Pm²)]/[3 (1 − 2c/W)]',
  basis: 'Plastic collapse of the net section.',
  scope: 'global',
  vanishing: 'exact',
  limits: [],
  stress: plateThroughWallReference,
};
