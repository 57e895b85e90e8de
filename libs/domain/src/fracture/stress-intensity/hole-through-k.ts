import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import { holeWidthLimit } from './corner-limits';
import { holeOneCrackFactor, holeTwoCracksFactor } from './hole-crack';
import { holeWidthFactor, type CrackedSides } from './hole-parts';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCES: Readonly<Record<CrackedSides, string>> = {
  1: 'Newman; Grandt 1975, crack at a hole; width: Newman and Raju, NASA TM-85793 (1984)',
  2: 'Newman 1971, fit of Bowie, cracks at a hole; width: Newman and Raju, NASA TM-85793 (1984)',
};

/**
 * K of one or two cracks through a plate from the edge of a hole, per unit of stress. Bending counts as membrane
 * stress of the face in tension: an upper estimate.
 * @param crack crack and wall: c from the edge of the hole, r, W [mm]
 * @param _angle not used: K is taken even over the thickness [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @param sides cracked sides of the hole [-]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 2(r + c)/W ≤ 0.5; tension one way only
 * @source Newman 1971, Grandt 1975; width: Newman and Raju, NASA TM-85793 (1984)
 * @example at(holeThroughInfluence, { a: 10, c: 5, t: 10, r: 5 }, 0, 2).membrane // 5.83699
 */
export function holeThroughInfluence(
  crack: Crack,
  _angle: Degrees,
  into: Influence,
  sides: CrackedSides,
): void {
  const { c, holeRadius } = crack;
  const factor = sides === 2 ? holeTwoCracksFactor : holeOneCrackFactor;
  into.membrane = Math.sqrt(Math.PI * c) * factor(c, holeRadius) * holeWidthFactor(crack, 1, sides);
  into.bending = into.membrane;
  into.reversedBending = into.membrane;
}

const holeThroughSolution = (
  key: string,
  title: string,
  formula: string,
  sides: CrackedSides,
): StressIntensitySolution => ({
  key,
  title,
  source: SOURCES[sides],
  formula: `K = (σm + |σb|) √(πc) fw (${formula}), ℓ = r/(r + c)`,
  accuracy:
    'Membrane within 0.6 % of finite elements in a wide plate. Bending counts in full as at the face in tension: an upper estimate.',
  limits: [holeWidthLimit(SOURCES[sides])],
  front: 'through',
  influence: (crack, angle, into) => holeThroughInfluence(crack, angle, into, sides),
  higher: null,
});

export const HOLE_THROUGH_ONE_K = holeThroughSolution(
  'hole-through-one',
  'Crack through the wall at one side of a hole',
  '0.7071 + 0.7548ℓ + 0.3415ℓ² + 0.6420ℓ³ + 0.9196ℓ⁴',
  1,
);
export const HOLE_THROUGH_TWO_K = holeThroughSolution(
  'hole-through-two',
  'Equal cracks through the wall at both sides of a hole',
  '1 + 0.358ℓ + 1.425ℓ² − 1.578ℓ³ + 2.156ℓ⁴',
  2,
);
