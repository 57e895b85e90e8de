import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { longCrackFactor, type LongWay } from './long-crack';
import {
  AXIAL_INSIDE_FIT,
  AXIAL_OUTSIDE_FIT,
  CIRCUMFERENTIAL_INSIDE_FIT,
  CIRCUMFERENTIAL_OUTSIDE_FIT,
  LONG_CRACK_SOURCE,
  type LongCrackFit,
} from './long-crack-fit';
import type { HigherInfluence, Influence, StressIntensitySolution } from './solution';

const LIMITS: readonly Limit[] = [
  {
    name: DEPTH_RATIO,
    text: 'a/t ≤ 0.8',
    min: 0,
    max: 0.8,
    measure: ({ a, thickness }) => a / thickness,
    source: LONG_CRACK_SOURCE,
    input: 'flaw.heightMm',
    instead: 'Treat the flaw as through-wall, repair, or ask a specialist.',
  },
  {
    name: 'Ri/t',
    text: 'Ri/t ≥ 1',
    min: 1,
    max: Infinity,
    measure: ({ insideRadius, thickness }) => insideRadius / thickness,
    source: LONG_CRACK_SOURCE,
    input: 'wall.insideDiameterMm',
    instead: 'Ask a specialist for a solution of a very thick wall.',
  },
];

/**
 * K of a crack without ends in the wall of a cylinder, per unit of stress.
 * @param crack crack and wall: a, t, Ri [mm]
 * @param _angle not used: the front is straight [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @param way along the cylinder or around it [-]
 * @param fit coefficients of the correction of the held strip [-]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity Ri/t ≥ 1, a/t ≤ 0.8
 * @source own fit of finite-element results, within 0.2 %
 * @example at(cylinderLongInfluence, { a: 4, c: 1, t: 10 }, 90, 'axial', []).membrane // 7.485802088
 */
export function cylinderLongInfluence(
  crack: Crack,
  _angle: Degrees,
  into: Influence,
  way: LongWay,
  fit: LongCrackFit,
): void {
  const root = Math.sqrt(Math.PI * crack.a);
  into.membrane = root * longCrackFactor(0, crack, way, fit);
  into.bending = into.membrane - 2 * root * longCrackFactor(1, crack, way, fit);
  into.reversedBending = -into.bending;
}

const longSolution = (
  key: string,
  title: string,
  way: LongWay,
  fit: LongCrackFit,
): StressIntensitySolution => ({
  key,
  title,
  source: `${LONG_CRACK_SOURCE}; strip held by the wall, corrected by a fit`,
  formula:
    'K = √(πa) Σ σn (a/t)ⁿ Gn, Gn of an edge crack in a strip held by the wall, times 1 + Σ cij uⁱ (a/t)ʲ, u = t/(Ri + 2t)',
  accuracy:
    'Within 0.2 % of 22 finite-element results for each coefficient; a radius of Ri/t ≥ 5 left out of the fit is met within 0.5 %.',
  limits: LIMITS,
  front: 'straight',
  influence: (crack, angle, into) => cylinderLongInfluence(crack, angle, into, way, fit),
  higher: (crack: Crack, _angle: Degrees, into: HigherInfluence) => {
    const root = Math.sqrt(Math.PI * crack.a);
    into.quadratic = root * longCrackFactor(2, crack, way, fit);
    into.cubic = root * longCrackFactor(3, crack, way, fit);
    into.quartic = root * longCrackFactor(4, crack, way, fit);
  },
});

export const CYLINDER_AXIAL_EXTENDED_INSIDE_K = longSolution(
  'cylinder-axial-extended-inside',
  'Axial flaw without ends, inside a cylinder',
  'axial',
  AXIAL_INSIDE_FIT,
);

export const CYLINDER_AXIAL_EXTENDED_OUTSIDE_K = longSolution(
  'cylinder-axial-extended-outside',
  'Axial flaw without ends, outside a cylinder',
  'axial',
  AXIAL_OUTSIDE_FIT,
);

export const CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K = longSolution(
  'cylinder-circumferential-full-inside',
  'Flaw around the whole circumference, inside a cylinder',
  'circumferential',
  CIRCUMFERENTIAL_INSIDE_FIT,
);

export const CYLINDER_CIRCUMFERENTIAL_FULL_OUTSIDE_K = longSolution(
  'cylinder-circumferential-full-outside',
  'Flaw around the whole circumference, outside a cylinder',
  'circumferential',
  CIRCUMFERENTIAL_OUTSIDE_FIT,
);
