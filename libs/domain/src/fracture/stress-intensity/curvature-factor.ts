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
  const change =
    longWeight * throughDepth(share.long, depth, angle) +
    (1 - longWeight) * throughDepth(share.round, depth, angle);
  const thinness = thickness / insideRadius / CURVATURE_AT;
  const bulging = aspect < LONG ? (LONG / aspect) ** 2 : 1;
  return change > 0 ? change * thinness * bulging : change * Math.min(thinness, 1);
}

/** Quadratic through 0 at no depth and the rows at a/t = 0.2 and 0.8. */
function throughDepth([shallow, deep]: CurvatureRows, depth: number, angle: number): number {
  const [s2, s8] = [alongFront(shallow, angle), alongFront(deep, angle)];
  const second = (s8 - 4 * s2) / 0.48;
  const first = (s2 - 0.04 * second) / 0.2;
  return (first + second * depth) * depth;
}

function alongFront(row: readonly number[], angle: number): number {
  const last = CURVATURE_ANGLES.length - 1;
  for (let i = 0; i < last; i++) {
    const [from, to] = [CURVATURE_ANGLES[i] ?? 0, CURVATURE_ANGLES[i + 1] ?? 90];
    if (angle > to && i < last - 1) continue;
    const [low, high] = [row[i] ?? 0, row[i + 1] ?? 0];
    const part = Math.min(Math.max((angle - from) / (to - from), 0), 1);
    return low + part * (high - low);
  }
  return 0;
}
