import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import type { HigherInfluence, Influence, StressIntensitySolution } from './solution';

const SOURCE =
  'quarter-circular crack at a nozzle corner, as in reactor vessel practice (from memory)';

const DEPTH: Limit = {
  name: DEPTH_RATIO,
  text: 'a/t ≤ 0.5',
  min: 0,
  max: 0.5,
  measure: (crack) => radiusOf(crack) / crack.thickness,
  source: 'common practice',
  input: 'flaw.heightMm',
  instead: 'Ask a specialist for a numerical analysis of this nozzle.',
};

const SHAPE: Limit = {
  name: 'a/c',
  text: '0.5 ≤ a/c ≤ 2',
  min: 0.5,
  max: 2,
  measure: ({ a, c }) => a / c,
  source: 'common practice',
  input: 'flaw.lengthMm',
  instead: 'Assess as a quarter circle around the flaw, or ask a specialist.',
};

/** Radius of the quarter circle around the flaw. */
const radiusOf = ({ a, c }: Crack) => Math.max(a, c);

// mean of xⁿ along a quarter circle, as a share of aⁿ, times the coefficient of the fit; the quartic
// coefficient, 0.372, continues the row of the four printed ones
const LINEAR = 0.551 * (2 / Math.PI);
const QUADRATIC = 0.462 / 2;
const CUBIC = 0.408 * (4 / (3 * Math.PI));
const QUARTIC = 0.372 * (3 / 8);

/**
 * K of a quarter-circular crack at a nozzle corner for a stress A0 + A1 x + A2 x² + A3 x³, x from the corner:
 * √(πa)[0.723 A0 + 0.551(2a/π)A1 + 0.462(a²/2)A2 + 0.408(4a³/3π)A3].
 * @param coefficients A0 to A3, lowest degree first [MPa/mmⁿ]
 * @param radius radius of the crack, a [mm]
 * @returns K [MPa·√mm]
 * @validity crack small against nozzle and wall
 * @source quarter-circular crack at a nozzle corner, as in reactor vessel practice (from memory)
 * @example nozzleCornerK([100, -5, 0.1, 0], 5) // 254.08123464
 */
export function nozzleCornerK(coefficients: readonly number[], radius: number): number {
  const [a0 = 0, a1 = 0, a2 = 0, a3 = 0] = coefficients;
  const sum = 0.723 * a0 + radius * (LINEAR * a1 + radius * (QUADRATIC * a2 + radius * CUBIC * a3));
  return Math.sqrt(Math.PI * radius) * sum;
}

/**
 * The same per unit of membrane and bending stress across the corner.
 * @param crack crack and wall: a, c, t [mm]
 * @param _angle not used: one value for the whole front [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/t ≤ 0.5; an uneven flaw counts as the quarter circle around it
 * @source quarter-circular crack at a nozzle corner, as in reactor vessel practice (from memory)
 * @example at(nozzleCornerInfluence, { a: 5, c: 5, t: 50 }, 45).membrane // 2.86548563617
 */
export function nozzleCornerInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const radius = radiusOf(crack);
  const depth = radius / crack.thickness;
  const root = Math.sqrt(Math.PI * radius);
  into.membrane = root * 0.723;
  into.bending = into.membrane - 2 * depth * root * LINEAR;
  into.reversedBending = -into.bending;
}

function higher(crack: Crack, _angle: Degrees, into: HigherInfluence): void {
  const radius = radiusOf(crack);
  const depth = radius / crack.thickness;
  const square = Math.sqrt(Math.PI * radius) * depth * depth;
  into.quadratic = square * QUADRATIC;
  into.cubic = square * depth * CUBIC;
  into.quartic = square * depth * depth * QUARTIC;
}

export const NOZZLE_CORNER_K: StressIntensitySolution = {
  key: 'nozzle-corner',
  title: 'Quarter-circular flaw at a nozzle corner',
  source: SOURCE,
  formula:
    'K = √(πa)[0.723 A0 + 0.551(2a/π)A1 + 0.462(a²/2)A2 + 0.408(4a³/3π)A3], σ = Σ An xⁿ across the corner',
  accuracy:
    'Recalled; not checked against another computation. A term of the fourth degree takes 0.372(3a⁴/8), which continues the printed row.',
  limits: [SHAPE, DEPTH],
  front: 'ellipse',
  influence: nozzleCornerInfluence,
  higher,
};
