import { centreToNearerFace, type Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { barPennyFactor } from './round-bar';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)';

/** Radius of the circle around the flaw. */
const radiusOf = ({ a, c }: Crack) => Math.max(a, c);

const DEPTH: Limit = {
  name: 'a/b',
  text: 'a/b ≤ 0.8, a the larger half axis, b from the centre of the flaw to the nearer surface',
  min: 0,
  max: 0.8,
  measure: (crack) => radiusOf(crack) / centreToNearerFace(crack),
  source: `${SOURCE}; checked against finite elements to 0.8`,
  input: 'flaw.heightMm',
  instead: 'Treat the flaw as a crack around the bar, or ask a specialist.',
};

/**
 * K of a flaw inside a round bar, per unit of stress of the whole section: a circle around the flaw, in a bar
 * that ends at the surface nearest to it. The thickness of the wall is the diameter of the bar. A stress that
 * varies over the flaw is taken at its highest there.
 * @param crack crack and bar: a, c, p, t = 2b [mm]
 * @param _angle not used: the front is a circle [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/b ≤ 0.8; off the centre an upper estimate of our own
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example at(barPennyInfluence, { a: 5, c: 5, p: 5, t: 20 }, 90).membrane // 2.72703371
 */
export function barPennyInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const radius = radiusOf(crack);
  const bar = centreToNearerFace(crack);
  const xi = Math.min(radius / bar, 0.999);
  into.membrane = (Math.sqrt(Math.PI * radius) * barPennyFactor(xi)) / (1 - xi * xi);
  const off = 1 - (2 * (crack.ligament + crack.a)) / crack.thickness;
  const spread = (2 * radius) / crack.thickness;
  into.bending = into.membrane * (off + spread);
  into.reversedBending = into.membrane * (spread - off);
}

export const BAR_PENNY_K: StressIntensitySolution = {
  key: 'bar-penny',
  title: 'Flaw inside a round bar, as a circle',
  source: SOURCE,
  formula:
    'K = σ/(1 − ξ²) (2/π)(1 + ½ξ − ⅝ξ² + 0.421ξ³) √(1 − ξ) √(πa), ξ = a/b, σ the highest over the flaw',
  accuracy:
    'Within 0.7 % of finite elements for a circle at the centre; off the centre an upper estimate.',
  limits: [DEPTH],
  front: 'ellipse',
  influence: barPennyInfluence,
  higher: null,
};
