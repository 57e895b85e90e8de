import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { bendingShare } from './newman-raju-1984';
import { angularFactor, shapeFactor } from './shape-factor';
import { fittedAspect, fittedDepth } from './corner-limits';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984), corner crack';

/** First coefficient of the square term of H2 for a corner crack. */
const DEEPEST_BENDING = 0.64;

const WIDTH: Limit = {
  name: 'c/W',
  text: 'c/W ≤ 0.5',
  min: 0,
  max: 0.5,
  measure: ({ c, width }) => c / width,
  source: SOURCE,
  input: 'flaw.lengthMm',
  instead: 'Assess as an extended flaw across the whole width, or ask a specialist.',
};

/**
 * Boundary correction of a quarter-elliptical corner crack in a plate, without width and fφ.
 * @param a depth along the thickness, a [mm]
 * @param c length along the width, c [mm]
 * @param thickness plate thickness, t [mm]
 * @param angle parametric angle φ, 90 at the end of a [°]
 * @returns (M1 + M2 (a/t)² + M3 (a/t)⁴) g1 g2 [-]
 * @validity 0.2 ≤ a/c ≤ 2, a/t < 1
 * @source Newman and Raju, NASA TM-85793 (1984), corner crack
 * @example cornerFactor(mm(1), mm(1), mm(1e9), degrees(90)) // 1.134
 */
export function cornerFactor(a: number, c: number, thickness: number, angle: Degrees): number {
  const long = a <= c;
  const r = long ? a / c : c / a;
  const depth2 = (a / thickness) ** 2;
  const m1 = long ? 1.08 - 0.03 * r : Math.sqrt(r) * (1.08 - 0.03 * r);
  const m2 = long ? -0.44 + 1.06 / (0.3 + r) : 0.375 * r * r;
  const m3 = long ? -0.5 + 0.25 * r + 14.8 * (1 - r) ** 15 : -0.25 * r * r;
  const size2 = long ? depth2 : (c / thickness) ** 2;
  const phi = (angle * Math.PI) / 180;
  const g1 = 1 + (0.08 + 0.4 * size2) * (1 - Math.sin(phi)) ** 3;
  const g2 = 1 + (0.08 + 0.15 * size2) * (1 - Math.cos(phi)) ** 3;
  return (m1 + (m2 + m3 * depth2) * depth2) * g1 * g2;
}

/** fw = 1 − 0.2λ + 9.4λ² − 19.4λ³ + 27.1λ⁴, λ = (c/W)√(a/t). */
function widthFactor({ a, c, thickness, width }: Crack): number {
  const l = (c / width) * Math.sqrt(a / thickness);
  return 1 + l * (-0.2 + l * (9.4 + l * (-19.4 + l * 27.1)));
}

/**
 * K of a quarter-elliptical corner crack in a plate, per unit of stress; bending about the face it opens on.
 * @param crack crack and wall: a along the thickness, c along the width, t, W [mm]
 * @param angle parametric angle φ, 90 at the end of a [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 0.2 ≤ a/c ≤ 2, a/t ≤ 0.8, c/W ≤ 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), corner crack
 * @example at(plateCornerInfluence, { a: 2, c: 4, t: 10, W: 50 }, 90).membrane // 2.48223060999
 */
export function plateCornerInfluence(crack: Crack, angle: Degrees, into: Influence): void {
  const { a, c, thickness } = crack;
  const sine = Math.sin((angle * Math.PI) / 180);
  const root = Math.sqrt((Math.PI * a) / shapeFactor(a, c));
  const shape = cornerFactor(a, c, thickness, angle) * angularFactor(a, c, sine);
  into.membrane = root * shape * widthFactor(crack);
  into.bending = into.membrane * bendingShare(a, c, a / thickness, sine, DEEPEST_BENDING);
  into.reversedBending = -into.bending;
}

export const PLATE_CORNER_K: StressIntensitySolution = {
  key: 'plate-corner',
  title: 'Quarter-elliptical flaw at the corner of a plate',
  source: SOURCE,
  formula: 'K = (σm + H σb) √(πa/Q) F, F = (M1 + M2 (a/t)² + M3 (a/t)⁴) g1 g2 fφ fw',
  accuracy:
    'Published ±5 %. Against finite elements at a/c = 0.5, away from the free faces: within 4 % at a/t = 0.2, 5.5 % low at a/t = 0.8 towards the long side.',
  limits: [fittedAspect(SOURCE), fittedDepth(DEPTH_RATIO, 'a/t', SOURCE, 1), WIDTH],
  front: 'ellipse',
  influence: plateCornerInfluence,
  higher: null,
};
