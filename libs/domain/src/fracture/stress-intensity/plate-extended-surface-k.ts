import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { heldStripBending, heldStripFactor, shellRestraint } from './held-strip';
import type { HigherInfluence, Influence, StressIntensitySolution } from './solution';
import { stripCoefficient } from './strip-coefficient';

const SOURCE = 'own fit of finite-element results for an edge crack in a strip';
const HELD_SOURCE = `${SOURCE}, held by superposition; stiffness of a shell after Timoshenko and Woinowsky-Krieger`;

/** Without a radius the wall counts as held no better than that of a cylinder of this Ri/t. */
const LEAST_HELD = 100;

const depthLimit = (max: number): Limit => ({
  name: DEPTH_RATIO,
  text: `a/t ≤ ${max}`,
  min: 0,
  max,
  measure: ({ a, thickness }) => a / thickness,
  source: `${SOURCE}: range checked`,
  input: 'flaw.heightMm',
  instead: 'Treat the flaw as through-wall, or repair.',
});

const radiusRatio = ({ insideRadius, thickness }: Crack) => insideRadius / thickness;
const heldBy = (crack: Crack) =>
  shellRestraint(crack.insideRadius < Infinity ? radiusRatio(crack) : LEAST_HELD);

/**
 * K of a surface crack that runs on without end along the face of a plate free to bend, per unit of stress.
 * @param crack crack and wall: a, t [mm]
 * @param _angle not used: the front is straight [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/t ≤ 0.9
 * @source own fit of finite-element results, within 0.1 %
 * @example at(plateExtendedInfluence, { a: 4, c: 400, t: 10 }, 90).membrane // 7.48580209
 */
export function plateExtendedInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const alpha = crack.a / crack.thickness;
  const root = Math.sqrt(Math.PI * crack.a);
  into.membrane = root * stripCoefficient(0, alpha);
  into.bending = into.membrane - 2 * alpha * root * stripCoefficient(1, alpha);
  into.reversedBending = -into.bending;
}

function plateExtendedHigher(crack: Crack, _angle: Degrees, into: HigherInfluence): void {
  const alpha = crack.a / crack.thickness;
  const square = Math.sqrt(Math.PI * crack.a) * alpha * alpha;
  into.quadratic = square * stripCoefficient(2, alpha);
  into.cubic = square * alpha * stripCoefficient(3, alpha);
  into.quartic = square * alpha * alpha * stripCoefficient(4, alpha);
}

/**
 * The same in a wall that resists turning as that of a cylinder does about a crack around it.
 * @param crack crack and wall: a, t, Ri [mm]
 * @param _angle not used: the front is straight [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity a/t ≤ 0.8, Ri/t ≥ 10; without a radius as at Ri/t = 100
 * @source own fits of finite-element results and the moment that turns the wall back
 * @example at(plateExtendedHeldInfluence, { a: 8, c: 400, t: 10 }, 90).membrane // 24.3024164
 */
export function plateExtendedHeldInfluence(crack: Crack, _angle: Degrees, into: Influence): void {
  const alpha = crack.a / crack.thickness;
  const root = Math.sqrt(Math.PI * crack.a);
  const restraint = heldBy(crack);
  into.membrane = root * heldStripFactor(0, alpha, restraint);
  into.bending = root * heldStripBending(alpha, restraint);
  into.reversedBending = -into.bending;
}

function plateExtendedHeldHigher(crack: Crack, _angle: Degrees, into: HigherInfluence): void {
  const alpha = crack.a / crack.thickness;
  const root = Math.sqrt(Math.PI * crack.a);
  const restraint = heldBy(crack);
  into.quadratic = root * heldStripFactor(2, alpha, restraint);
  into.cubic = root * heldStripFactor(3, alpha, restraint);
  into.quartic = root * heldStripFactor(4, alpha, restraint);
}

export const PLATE_EXTENDED_SURFACE_K: StressIntensitySolution = {
  key: 'plate-extended-surface',
  title: 'Surface flaw across a plate that is free to bend',
  source: SOURCE,
  formula: 'K = √(πa) Σ σn (a/t)ⁿ Gn, Gn = Σ ck αᵏ/(1 − α)^1.5, α = a/t; bending: G0 − 2α G1',
  accuracy: 'Within 0.1 % of finite elements, bending within 0.5 %.',
  limits: [depthLimit(0.9)],
  front: 'straight',
  influence: plateExtendedInfluence,
  higher: plateExtendedHigher,
};

export const PLATE_EXTENDED_SURFACE_HELD_K: StressIntensitySolution = {
  key: 'plate-extended-surface-held',
  title: 'Very long surface flaw in a wall that is held against bending',
  source: HELD_SOURCE,
  formula:
    'K = √(πa) Σ σn (a/t)ⁿ Gn − K of the moment that turns the wall back, M = −6π ∫x Gn Fb dx/(6π ∫x Fb² dx + L/t), L/t = 2√(R/t)/[3(1 − ν²)]^¼',
  accuracy:
    'Against finite elements of full-circumference cracks inside a cylinder: 0.1 to 0.3 % high at Ri/t = 100, 1 to 3 % high at Ri/t = 10.',
  limits: [
    depthLimit(0.8),
    {
      name: 'Ri/t',
      text: 'Ri/t ≥ 10 where the wall has a radius',
      min: 10,
      max: Infinity,
      measure: (crack) => radiusRatio(crack),
      source: HELD_SOURCE,
      input: 'wall.insideDiameterMm',
      instead: 'Use the coefficients of the cylinder.',
    },
  ],
  front: 'straight',
  influence: plateExtendedHeldInfluence,
  higher: plateExtendedHeldHigher,
};
