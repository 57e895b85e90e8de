import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import type { HigherInfluence, Influence, StressIntensitySolution } from './solution';
import { stripCoefficient } from './strip-coefficient';

const SOURCE = 'own fit of finite-element results for an edge crack in a strip free to bend';

const WIDTH: Limit = {
  name: 'a/W',
  text: 'a/W ≤ 0.9',
  min: 0,
  max: 0.9,
  measure: ({ a, width }) => a / width,
  source: `${SOURCE}: range of the fit`,
  input: 'flaw.lengthMm',
  instead: 'Little of the plate is left: repair, or ask a specialist.',
};

/**
 * K of a crack through the free edge of a plate, per unit of stress. Bending is that in the plane of the plate:
 * the stress falls as 1 − 2x/W over the width, x from the edge with the crack.
 * @param crack crack and wall: a, W [mm]
 * @param _angle not used: the front is straight [°]
 * @param into receives K per unit of membrane and in-plane bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/W ≤ 0.9, free to bend
 * @source own fit of finite-element results, within 0.1 %
 * @example at(plateEdgeInfluence, { a: 40, c: 40, W: 100 }, 90).bending // 14.13348579
 */
export function plateEdgeInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const alpha = crack.a / crack.width;
  const root = Math.sqrt(Math.PI * crack.a);
  into.membrane = root * stripCoefficient(0, alpha);
  into.bending = into.membrane - 2 * alpha * root * stripCoefficient(1, alpha);
  into.reversedBending = -into.bending;
}

function higher(crack: Crack, _angle: Degrees, into: HigherInfluence): void {
  const alpha = crack.a / crack.width;
  const square = Math.sqrt(Math.PI * crack.a) * alpha * alpha;
  into.quadratic = square * stripCoefficient(2, alpha);
  into.cubic = square * alpha * stripCoefficient(3, alpha);
  into.quartic = square * alpha * alpha * stripCoefficient(4, alpha);
}

export const PLATE_EDGE_K: StressIntensitySolution = {
  key: 'plate-edge',
  title: 'Crack through the free edge of a plate, stress over the width of the plate',
  source: SOURCE,
  formula:
    'K = √(πa) Σ σn (a/W)ⁿ Gn, Gn = Σ ck αᵏ/(1 − α)^1.5, α = a/W; bending in the plane: G0 − 2α G1',
  accuracy: 'Within 0.1 % of finite elements, in-plane bending within 0.5 %.',
  limits: [WIDTH],
  front: 'straight',
  influence: plateEdgeInfluence,
  higher,
};
