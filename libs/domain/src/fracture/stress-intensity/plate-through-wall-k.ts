import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { centreCrackFactor } from './centre-crack';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook, after Isida';

const WIDTH: Limit = {
  name: '2c/W',
  text: '2c/W ≤ 0.9',
  min: 0,
  max: 0.9,
  measure: ({ c, width }) => (2 * c) / width,
  source: `${SOURCE}; checked against finite elements to 0.9`,
  input: 'flaw.lengthMm',
  instead: 'Little of the plate is left: repair, or ask a specialist.',
};

/**
 * K of a crack through a plate, central in its width, per unit of stress. Bending of the plate counts as
 * membrane stress of the face in tension, whichever that is: an upper estimate, as no more exact form is used.
 * @param crack crack and wall: c, W [mm]
 * @param _angle not used: K is taken even over the thickness [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 2c/W ≤ 0.9
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook, after Isida
 * @example at(plateThroughWallInfluence, { a: 10, c: 25, t: 10, W: 100 }, 0).membrane // 10.51272597
 */
export function plateThroughWallInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const alpha = Math.min((2 * crack.c) / crack.width, 0.999);
  into.membrane = Math.sqrt(Math.PI * crack.c) * centreCrackFactor(alpha);
  into.bending = into.membrane;
  into.reversedBending = into.membrane;
}

export const PLATE_THROUGH_WALL_K: StressIntensitySolution = {
  key: 'plate-through-wall',
  title: 'Crack through a plate',
  source: SOURCE,
  formula: 'K = (σm + |σb|) √(πc) (1 − 0.025α² + 0.06α⁴) √sec(πα/2), α = 2c/W',
  accuracy:
    'Membrane within 0.1 % of finite elements. Bending counts in full as at the face in tension: an upper estimate.',
  limits: [WIDTH],
  front: 'through',
  influence: plateThroughWallInfluence,
  higher: null,
};
