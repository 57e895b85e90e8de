import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { MPa } from '../../units/quantity';
import { cornerReference } from './corner-reference';
import type { ReferenceStressSolution } from './solution';
import { soundWall } from './sound-wall';

const SOURCE = 'net section, common practice: at a hole the local peak is not a membrane stress';

/** Sides of the hole that are cracked. */
export type FlawedSides = 1 | 2;

const NET: Limit = {
  name: '2r/W',
  text: '2r/W ≤ 0.5',
  min: 0,
  max: 0.5,
  measure: ({ holeRadius, width }) => (2 * holeRadius) / width,
  source: 'common practice',
  input: 'wall.holeRadiusMm',
  instead: 'Little of the plate is left beside the hole: ask a specialist.',
};

/**
 * Reference stress of cracks through the wall at a hole: that of the sound wall over what is left of the
 * width, 1 − (2r + n c)/W.
 * @param crack crack and wall: c from the edge of the hole, r, W [mm]
 * @param membrane primary membrane stress in the full plate, Pm [MPa]
 * @param bending primary bending stress in the full plate, Pb [MPa]
 * @param sides cracked sides of the hole, n [-]
 * @returns reference stress, σref; Infinity once nothing is left [MPa]
 * @validity 2r + n c < W; one crack: plate held against bending in its plane
 * @source equilibrium of the net section
 * @example holeThroughReference(crackOf({ a: 10, c: 10, t: 10, r: 10, W: 200 }), mpa(100), mpa(0), 2) // 125
 */
export function holeThroughReference(
  { c, holeRadius, width }: Crack,
  membrane: MPa,
  bending: MPa,
  sides: FlawedSides,
): MPa {
  const left = 1 - (2 * holeRadius + sides * c) / width;
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  return (soundWall(membrane, bending) / left) as MPa;
}

/**
 * Reference stress of corner flaws at a hole: the corner form under the stress of the plate's net section.
 * @param crack crack and wall: a, c, t, r, W [mm]
 * @param membrane primary membrane stress in the full plate, Pm [MPa]
 * @param bending primary bending stress in the full plate, Pb [MPa]
 * @param sides cracked sides of the hole, n [-]
 * @returns reference stress, σref; Infinity once nothing is left [MPa]
 * @validity 2r < W, a < t
 * @source BS 7910:2013 Annex P.7.1 (from memory) on the net section, common practice
 * @example holeCornerReference(crackOf({ a: 5, c: 15, t: 20, r: 10, W: 1e9 }), mpa(100), mpa(0), 1) // 107.3170753
 */
export function holeCornerReference(
  crack: Crack,
  membrane: MPa,
  bending: MPa,
  sides: FlawedSides,
): MPa {
  const left = 1 - (2 * crack.holeRadius) / crack.width;
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  const local = cornerReference(crack, (membrane / left) as MPa, (bending / left) as MPa);
  const whole = holeThroughReference(
    { ...crack, c: ((crack.c * crack.a) / crack.thickness) as Crack['c'] },
    membrane,
    bending,
    sides,
  );
  return Math.max(local, whole) as MPa;
}

const solution = (
  key: string,
  title: string,
  formula: string,
  stress: ReferenceStressSolution['stress'],
): ReferenceStressSolution => ({
  key,
  title,
  source: SOURCE,
  formula,
  basis: 'Collapse of the net section; the stress peak at the hole yields without collapse.',
  scope: 'global',
  vanishing: 'exact',
  limits: [NET],
  stress,
});

const THROUGH = 'σref = [Pb + √(Pb² + 9 Pm²)]/[3 (1 − (2r + n c)/W)]';
const CORNER = 'corner form under Pm/(1 − 2r/W), at least the net section with n a c/t taken out';

export const HOLE_THROUGH_ONE_REFERENCE = solution(
  'hole-through-one',
  'Crack through the wall at one side of a hole',
  THROUGH,
  (crack, pm, pb) => holeThroughReference(crack, pm, pb, 1),
);
export const HOLE_THROUGH_TWO_REFERENCE = solution(
  'hole-through-two',
  'Cracks through the wall at both sides of a hole',
  THROUGH,
  (crack, pm, pb) => holeThroughReference(crack, pm, pb, 2),
);
export const HOLE_CORNER_ONE_REFERENCE = solution(
  'hole-corner-one',
  'Corner flaw at one side of a hole',
  CORNER,
  (crack, pm, pb) => holeCornerReference(crack, pm, pb, 1),
);
export const HOLE_CORNER_TWO_REFERENCE = solution(
  'hole-corner-two',
  'Corner flaws at both sides of a hole',
  CORNER,
  (crack, pm, pb) => holeCornerReference(crack, pm, pb, 2),
);
