import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import { PLATE_LIKE_WALL, shellLength, shellLengthLimit } from './curved-limits';
import { higherByWeight } from './higher-by-weight';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';
import { PLATE_SURFACE_K, PLATE_SURFACE_LIMITS, plateSurfaceInfluence } from './plate-surface-k';
import type { Influence, StressIntensitySolution } from './solution';
import { sphereThroughFactor } from './through-wall-bulging';

/**
 * Rise of K of a surface crack by the bulging of its shell: that of the crack through the wall, by the share of
 * the wall that is cracked, 1 + (a/t)(F − 1).
 * @param depth a/t [-]
 * @param through factor F of the crack through the wall [-]
 * @returns factor on the plate value [-]
 * @validity an upper estimate: with the cylinder's F not more than 0.5 % below finite elements of axial outside cracks
 * @source own rule
 * @example bulgingOfDepth(0.5, 1.2) // 1.1
 */
export const bulgingOfDepth = (depth: number, through: number): number =>
  1 + Math.min(depth, 1) * (through - 1);

/**
 * K of a semi-elliptical surface crack in a sphere, per unit of stress: the plate, raised by bulging.
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param angle parametric angle φ, 90 at the deepest point [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity the plate's limits, Ri/t ≥ 5, c/√(Rt) ≤ 1
 * @source Newman and Raju, NASA TM-85793 (1984), with an own rule for the bulging of the shell
 * @example at(sphereSurfaceInfluence, { a: 2, c: 10, t: 20, W: 100 }, 90).membrane // 2.70094735805
 */
export function sphereSurfaceInfluence(crack: Crack, angle: Degrees, into: Influence): void {
  plateSurfaceInfluence(crack, angle, into);
  const rise = bulgingOfDepth(crack.a / crack.thickness, sphereThroughFactor(shellLength(crack)));
  into.membrane *= rise;
  into.bending *= rise;
  into.reversedBending = -into.bending;
}

export const SPHERE_SURFACE_K: StressIntensitySolution = {
  key: 'sphere-surface',
  title: 'Semi-elliptical surface flaw in a sphere',
  source: `${PLATE_SURFACE_K.source}; bulging: Folias 1965 (from memory), in proportion to the depth by an own rule`,
  formula: 'K = plate value times 1 + (a/t)(√(1 + 1.93x²) − 1), x = c/√(Rt)',
  accuracy: `${PLATE_SURFACE_K.accuracy} The rise by curvature is an estimate meant as an upper one: the same rule with the cylinder's factor is not more than 0.5 % below finite elements of axial outside flaws.`,
  limits: [...PLATE_SURFACE_LIMITS, PLATE_LIKE_WALL, shellLengthLimit(1, 'common practice')],
  front: 'ellipse',
  influence: sphereSurfaceInfluence,
  higher: (crack, angle, into) => higherByWeight(crack, angle, into, sphereSurfaceInfluence),
};

/** Embedded flaws feel the curvature of the wall least: the plate form is used as it is. */
export const SPHERE_EMBEDDED_K: StressIntensitySolution = {
  ...PLATE_EMBEDDED_K,
  key: 'sphere-embedded',
  title: 'Embedded elliptical flaw in the wall of a sphere, as in a plate',
  accuracy: `${PLATE_EMBEDDED_K.accuracy} Curvature is left out: common practice for Ri/t ≥ 5.`,
  limits: [...PLATE_EMBEDDED_K.limits, PLATE_LIKE_WALL],
};
