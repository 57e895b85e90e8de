import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import { circumferentialTension } from './circumferential-factors';
import {
  angleShare,
  meanRadius,
  meanRadiusLimit,
  shellLength,
  shellLengthLimit,
} from './curved-limits';
import type { Influence, StressIntensitySolution } from './solution';
import { axialThroughFactor, sphereThroughFactor } from './through-wall-bulging';

const ZAHOOR = 'Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders';
const FOLIAS = 'Folias 1965 (from memory)';

const UPPER =
  'Bending through the wall counts as membrane stress of the face in tension, whichever that is: an upper estimate.';

/** Writes K = σ F √(πc) for membrane, and the same for bending as at the face in tension. */
function fill(into: Influence, c: number, factor: number): void {
  into.membrane = factor * Math.sqrt(Math.PI * c);
  into.bending = into.membrane;
  into.reversedBending = into.membrane;
}

/**
 * K of an axial crack through the wall of a cylinder, per unit of hoop stress; the crack bulges.
 * @param crack crack and wall: c, t, Ri [mm]
 * @param _angle not used: K is taken even over the thickness [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity c/√(Rt) ≤ 5, R/t ≥ 5
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example at(cylinderAxialThroughInfluence, { a: 5, c: 10, t: 10, Ri: 95 }, 0).membrane // 6.368755844
 */
export function cylinderAxialThroughInfluence(
  crack: Crack,
  _angle: Degrees,
  into: Influence,
): void {
  fill(into, crack.c, axialThroughFactor(shellLength(crack)));
}

/**
 * K of a circumferential crack through the wall of a cylinder, per unit of axial stress; θ = c/R.
 * @param crack crack and wall: c at the mean radius, t, Ri [mm]
 * @param _angle not used: K is taken even over the thickness [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity θ/π ≤ 0.55, 5 ≤ R/t ≤ 20
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example at(cylinderCircumferentialThroughInfluence, { a: 5, c: 10 * Math.PI, t: 10, Ri: 95 }, 0).membrane // 11.61988347
 */
export function cylinderCircumferentialThroughInfluence(
  crack: Crack,
  _angle: Degrees,
  into: Influence,
): void {
  // beyond the whole circumference there is no more to crack
  const share = Math.min(angleShare(crack), 1);
  fill(into, crack.c, circumferentialTension(share, meanRadius(crack) / crack.thickness));
}

/**
 * K of a crack through the wall of a sphere, per unit of membrane stress; the crack bulges.
 * @param crack crack and wall: c, t, Ri [mm]
 * @param _angle not used: K is taken even over the thickness [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity c/√(Rt) ≤ 3, R/t ≥ 10 (common practice)
 * @source Folias 1965 (from memory)
 * @example at(sphereThroughInfluence, { a: 5, c: 10, t: 10, Ri: 95 }, 0).membrane // 6.122025838
 */
export function sphereThroughInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  fill(into, crack.c, sphereThroughFactor(shellLength(crack)));
}

export const CYLINDER_AXIAL_THROUGH_WALL_K: StressIntensitySolution = {
  key: 'cylinder-axial-through-wall',
  title: 'Axial crack through the wall of a cylinder',
  source: ZAHOOR,
  formula: 'K = (σm + |σb|) √(πc) √(1 + 0.52x + 1.29x² − 0.074x³), x = c/√(Rt)',
  accuracy: `The other published bulging factors lie from 10 % below to 6 % above it to x = 2. ${UPPER}`,
  limits: [shellLengthLimit(5, ZAHOOR), meanRadiusLimit(5, Infinity, 'common practice')],
  front: 'through',
  influence: cylinderAxialThroughInfluence,
  higher: null,
};

export const CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K: StressIntensitySolution = {
  key: 'cylinder-circumferential-through-wall',
  title: 'Circumferential crack through the wall of a cylinder',
  source: ZAHOOR,
  formula:
    'K = (σm + |σb|) √(πc) {1 + A [5.3303 (θ/π)^1.5 + 18.773 (θ/π)^4.24]}, θ = c/R, A from R/t',
  accuracy: `Axial tension; for bending of the whole pipe an upper estimate when the stress of the outermost fibre is entered. ${UPPER}`,
  limits: [
    {
      name: 'θ/π',
      text: 'θ/π ≤ 0.55',
      min: 0,
      max: 0.55,
      measure: angleShare,
      source: ZAHOOR,
      input: 'flaw.lengthMm',
      instead: 'Little of the section is left: repair, or ask a specialist.',
    },
    meanRadiusLimit(5, 20, ZAHOOR),
  ],
  front: 'through',
  influence: cylinderCircumferentialThroughInfluence,
  higher: null,
};

export const SPHERE_THROUGH_WALL_K: StressIntensitySolution = {
  key: 'sphere-through-wall',
  title: 'Crack through the wall of a sphere',
  source: FOLIAS,
  formula: 'K = (σm + |σb|) √(πc) √(1 + 1.93x²), x = c/√(Rt)',
  accuracy: `Shell theory, not checked against finite elements here. ${UPPER}`,
  limits: [
    shellLengthLimit(3, 'common practice'),
    meanRadiusLimit(10, Infinity, 'common practice: thin shell'),
  ],
  front: 'through',
  influence: sphereThroughInfluence,
  higher: null,
};
