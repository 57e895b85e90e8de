import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { curvatureShare } from './curvature-factor';
import {
  AXIAL_INSIDE,
  AXIAL_OUTSIDE,
  CIRCUMFERENTIAL_INSIDE,
  CURVATURE_SOURCE,
  type CurvatureTable,
} from './curvature-table';
import { freeStripFactor } from './free-strip-factor';
import { higherByWeight, type SurfaceInfluence } from './higher-by-weight';
import { PLATE_SURFACE_K, PLATE_SURFACE_LIMITS, plateSurfaceInfluence } from './plate-surface-k';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = `${PLATE_SURFACE_K.source}; curvature: ${CURVATURE_SOURCE}`;

const DEEPEST = 90 as Degrees;
const SCRATCH: Influence = { membrane: 0, bending: 0, reversedBending: 0 };

/**
 * Curvature share of the uniform coefficient, never beyond what a crack of unlimited length in a strip free
 * to bend has: no crack of that depth in a cylinder has more.
 */
function uniformShare(crack: Crack, angle: Degrees, plate: number, table: CurvatureTable): number {
  const share = curvatureShare(table.uniform, crack, angle);
  if (share <= 0) return share;
  const longest = Math.sqrt(Math.PI * crack.a) * freeStripFactor(crack.a / crack.thickness);
  return Math.min(share, Math.max(longest / plate - 1, 0));
}

const WALL_LIMIT: Limit = {
  name: 'Ri/t',
  text: 'Ri/t ≥ 5',
  min: 5,
  max: Infinity,
  measure: ({ insideRadius, thickness }) => insideRadius / thickness,
  source: CURVATURE_SOURCE,
  input: 'wall.insideDiameterMm',
  instead: 'Ask a specialist for a thick-wall solution with influence coefficients.',
};

const bulgingLimit = (table: CurvatureTable): Limit => ({
  name: 'curvature correction',
  text: 'curvature raises K at the deepest point by at most 50 %',
  min: -1,
  max: 0.5,
  measure: (crack) => {
    plateSurfaceInfluence(crack, DEEPEST, SCRATCH);
    return uniformShare(crack, DEEPEST, SCRATCH.membrane, table);
  },
  source: CURVATURE_SOURCE,
  input: 'flaw.lengthMm',
  instead:
    'Ask a specialist for a shell analysis of this long flaw, or assess it as fully extended.',
});

/**
 * K of a semi-elliptical surface crack in a cylinder, per unit of stress: the plate's uniform and linear
 * coefficients G0 and G1, each changed by curvature; bending is G0 − 2 (a/t) G1.
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param angle parametric angle φ, 90 at the deepest point [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @param table rows of the curvature effect [-]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity limits of the plate; Ri/t ≥ 5; correction at most 50 %
 * @source Newman and Raju, NASA TM-85793 (1984); curvature from own finite elements at Ri/t = 10
 * @example at(cylinderSurfaceInfluence, { a: 2, c: 10, t: 10, Ri: 1e9 }, 90, AXIAL_INSIDE).membrane // 2.81275164
 */
export function cylinderSurfaceInfluence(
  crack: Crack,
  angle: Degrees,
  into: Influence,
  table: CurvatureTable,
): void {
  plateSurfaceInfluence(crack, angle, into);
  const uniform = into.membrane;
  // 2 (a/t) G1 of the plate: what bending lacks against membrane
  const linear = uniform - into.bending;
  const free = curvatureShare(table.uniform, crack, angle);
  const share = uniformShare(crack, angle, uniform, table);
  // where the uniform share is held back, the linear one is held back alike
  const held = free > 0 ? share / free : 1;
  into.membrane = uniform * (1 + share);
  into.bending = into.membrane - linear * (1 + held * curvatureShare(table.linear, crack, angle));
  into.reversedBending = -into.bending;
}

const HIGHER =
  'Terms (x/t)² to (x/t)⁴: deepest point within 3 % at a/c = 0.2 and 7 % at 1; along the front at most 4 % of the uniform coefficient low and 12 % high.';

const cylinderSolution = (
  key: string,
  title: string,
  table: CurvatureTable,
  accuracy: string,
): StressIntensitySolution => {
  const influence: SurfaceInfluence = (crack, angle, into) =>
    cylinderSurfaceInfluence(crack, angle, into, table);
  return {
    key,
    title,
    source: SOURCE,
    formula:
      'K = plate value of G0 and G1, each times (1 + curvature share); σm G0 + σb (G0 − 2 (a/t) G1); (x/t)² to (x/t)⁴ by weight function from G0 and G1',
    accuracy,
    limits: [...PLATE_SURFACE_LIMITS, WALL_LIMIT, bulgingLimit(table)],
    front: 'ellipse',
    influence,
    higher: (crack, angle, into) => higherByWeight(crack, angle, into, influence),
  };
};

export const CYLINDER_AXIAL_INSIDE_K = cylinderSolution(
  'cylinder-axial-inside',
  'Axial semi-elliptical flaw, inside a cylinder',
  AXIAL_INSIDE,
  `Within 5 % of finite elements at Ri/t = 10 for the deepest point. ${HIGHER}`,
);

export const CYLINDER_AXIAL_OUTSIDE_K = cylinderSolution(
  'cylinder-axial-outside',
  'Axial semi-elliptical flaw, outside a cylinder',
  AXIAL_OUTSIDE,
  `Within 5 % of finite elements at Ri/t = 10 for the deepest point. ${HIGHER}`,
);

export const CYLINDER_CIRCUMFERENTIAL_INSIDE_K = cylinderSolution(
  'cylinder-circumferential-inside',
  'Circumferential semi-elliptical flaw, inside a cylinder',
  CIRCUMFERENTIAL_INSIDE,
  `Within 5 % of finite elements at Ri/t = 10, a/c = 0.2; less reduction than computed elsewhere. ${HIGHER}`,
);

/** No finite-element rows exist for this one: the plate is never below the held cylinder. */
export const CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K: StressIntensitySolution = {
  ...PLATE_SURFACE_K,
  key: 'cylinder-circumferential-outside',
  title: 'Circumferential semi-elliptical flaw, outside a cylinder',
  accuracy:
    'Plate value without the relief a cylinder gives: an upper estimate (full-circumference outside cracks stay below the longest plate crack at every wall computed, but for 2 % at a/t = 0.2 in a wall of Ri/t = 100). No finite-element rows of finite flaws exist.',
  limits: [...PLATE_SURFACE_LIMITS, WALL_LIMIT],
};
