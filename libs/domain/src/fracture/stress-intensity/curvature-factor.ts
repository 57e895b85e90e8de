import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import {
  CURVATURE_ANGLES,
  CURVATURE_AT,
  type CurvatureRows,
  type CurvatureShare,
} from './curvature-table';

/** a/c of the two sets of rows. */
const LONG = 0.2;
const ROUND = 1;

/**
 * Change of an influence coefficient by the curvature of the wall, as a share of the plate value; it goes
 * to 0 for thin walls. Between the rows: quadratic in a/t through 0, linear in a/c and φ, linear in t/Ri.
 * Longer flaws than a/c = 0.2 bulge with (c/a)², as shells do; a reduction is never claimed to grow beyond
 * what was computed.
 * @param share rows of the finite-element results [-]
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param angle parametric angle φ [°]
 * @returns share of the plate value to add [-]
 * @validity a/t ≤ 0.8, Ri/t ≥ 5; between rows an interpolation of our own
 * @source own finite elements at Ri/t = 10
 * @example curvatureShare(AXIAL_OUTSIDE.uniform, crackOf({ a: 8, c: 40, t: 10, Ri: 100 }), 90) // 0.3246
 */
export function curvatureShare(share: CurvatureShare, crack: Crack, angle: Degrees): number {
  const { a, c, thickness, insideRadius } = crack;
  const aspect = a / c;
  const depth = Math.min(a / thickness, 0.8);
  const longWeight = (ROUND - Math.min(Math.max(aspect, LONG), ROUND)) / (ROUND - LONG);
  const long = longWeight > 0 ? longWeight * throughDepth(share.long, depth, angle) : 0;
  const round = longWeight < 1 ? (1 - longWeight) * throughDepth(share.round, depth, angle) : 0;
  const change = long + round;
  const thinness = thickness / insideRadius / CURVATURE_AT;
  const bulging = aspect < LONG ? (LONG / aspect) ** 2 : 1;
  return change > 0 ? change * thinness * bulging : change * Math.min(thinness, 1);
}

/** Quadratic through 0 at no depth and the rows at a/t = 0.2 and 0.8. */
function throughDepth(rows: CurvatureRows, depth: number, angle: number): number {
  const s2 = alongFront(rows[0], angle);
  const second = (alongFront(rows[1], angle) - 4 * s2) / 0.48;
  const first = (s2 - 0.04 * second) / 0.2;
  return (first + second * depth) * depth;
}

/** Straight between the angles of a row; below the first angle its value is held. */
function alongFront(row: readonly number[], angle: number): number {
  let i = 0;
  while (i < CURVATURE_ANGLES.length - 2 && angle > (CURVATURE_ANGLES[i + 1] ?? 90)) i++;
  const from = CURVATURE_ANGLES[i] ?? 0;
  const to = CURVATURE_ANGLES[i + 1] ?? 90;
  const part = Math.min(Math.max((angle - from) / (to - from), 0), 1);
  const low = row[i] ?? 0;
  return low + part * ((row[i + 1] ?? 0) - low);
}
