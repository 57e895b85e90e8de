import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { barRingBending, barRingFactor } from './round-bar';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE =
  'own fit of finite-element results in the form of Tada, Paris and Irwin; bending: The Stress Analysis of Cracks Handbook (from memory)';

const DEPTH: Limit = {
  name: DEPTH_RATIO,
  text: 'a/t ≤ 0.4, t the diameter',
  min: 0,
  max: 0.4,
  measure: ({ a, thickness }) => a / thickness,
  source: `${SOURCE}: range checked`,
  input: 'flaw.heightMm',
  instead: 'A ligament of less than a fifth of the diameter is left: repair or replace.',
};

/**
 * K of a crack around a round bar, per unit of stress of the whole section; the thickness of the wall is the
 * diameter of the bar. Bending is that of the bar, taken where the ring opens most, for either sign.
 * @param crack crack and bar: depth a, t = 2b [mm]
 * @param _angle not used: the front is taken even [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/t ≤ 0.4
 * @source own fit of finite-element results; bending: Tada, Paris and Irwin (from memory)
 * @example at(barRingInfluence, { a: 5, c: 5, t: 20 }, 90).membrane // 7.67428391
 */
export function barRingInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const radius = crack.thickness / 2;
  const ligament = Math.max(radius - crack.a, 1e-6 * radius);
  const xi = ligament / radius;
  const root = Math.sqrt(Math.PI * ligament);
  into.membrane = (root * barRingFactor(xi)) / (xi * xi);
  into.bending = (root * barRingBending(xi)) / (xi * xi * xi);
  into.reversedBending = into.bending;
}

export const BAR_RING_K: StressIntensitySolution = {
  key: 'bar-ring',
  title: 'Crack around a round bar',
  source: SOURCE,
  formula:
    'K = [σm ½(1 + ½ξ + ⅜ξ² − 0.181ξ³ + 0.989ξ⁴ − 0.440ξ⁵)/ξ² + |σb| ⅜(1 + ½ξ + ⅜ξ² + 5/16 ξ³ + 35/128 ξ⁴ + 0.537ξ⁵)/ξ³] √(1 − ξ) √(πξb), ξ = 1 − a/b, b = t/2',
  accuracy:
    'Tension within 0.6 % of finite elements; bending not checked between its exact limits.',
  limits: [DEPTH],
  front: 'straight',
  influence: barRingInfluence,
  higher: null,
};
