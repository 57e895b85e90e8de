import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees, MPa, MPaSqrtMm } from '../../units/quantity';
import { angularFactor, shapeFactor } from './shape-factor';

const SOURCE = 'Newman and Raju 1980 (from memory)';

/** Limits of the equation. */
export const NEWMAN_RAJU_1980_LIMITS: readonly Limit[] = [
  {
    name: 'a/c',
    text: '0.2 ≤ a/c ≤ 1',
    min: 0.2,
    max: 1,
    measure: ({ a, c }) => a / c,
    source: SOURCE,
    input: 'flaw.lengthMm',
    instead: 'Use the influence coefficients of the surface flaw, or of the flaw without ends.',
  },
  {
    name: DEPTH_RATIO,
    text: 'a/t ≤ 0.8',
    min: 0,
    max: 0.8,
    measure: ({ a, thickness }) => a / thickness,
    source: SOURCE,
    input: 'flaw.heightMm',
    instead: 'Treat the flaw as through-wall, or repair.',
  },
  {
    name: 'Ri/t',
    text: 'Ri/t ≥ 4',
    min: 4,
    max: Infinity,
    measure: ({ insideRadius, thickness }) => insideRadius / thickness,
    source: SOURCE,
    input: 'wall.insideDiameterMm',
    instead: 'Use the influence coefficients of a thick wall.',
  },
];

/**
 * K of an axial semi-elliptical crack inside a cylinder under internal pressure, pressure on its faces
 * included: K = (p Ri/t) √(πa/Q) F. A cross check of the catalogue, not part of it.
 * @param pressure internal pressure, p [MPa]
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param angle parametric angle φ, 90 at the deepest point [°]
 * @returns mode I stress intensity [MPa·√mm]
 * @validity 0.2 ≤ a/c ≤ 1, a/t ≤ 0.8, Ri/t ≥ 4
 * @source Newman and Raju 1980 (from memory)
 * @example newmanRaju1980(mpa(10), crackOf({ a: 5, c: 12.5, t: 10, Ri: 100 }), 90) // 485.973213016
 */
export function newmanRaju1980(pressure: MPa, crack: Crack, angle: Degrees): MPaSqrtMm {
  const { a, c, thickness, insideRadius } = crack;
  const sine = Math.sin((angle * Math.PI) / 180);
  const r = a / c;
  const depth = a / thickness;
  const outside = insideRadius + thickness;
  const m1 = 1.13 - 0.09 * r;
  const m2 = -0.54 + 0.89 / (0.2 + r);
  const m3 = 0.5 - 1 / (0.65 + r) + 14 * (1 - r) ** 24;
  const g = 1 + (0.1 + 0.35 * depth ** 2) * (1 - sine) ** 2;
  const lame = (outside ** 2 + insideRadius ** 2) / (outside ** 2 - insideRadius ** 2);
  const fc = (lame + 1 - 0.5 * Math.sqrt(depth)) * (thickness / insideRadius);
  const f = 0.97 * (m1 + m2 * depth ** 2 + m3 * depth ** 4) * g * angularFactor(a, c, sine) * fc;
  const hoop = (pressure * insideRadius) / thickness;
  return (hoop * Math.sqrt((Math.PI * a) / shapeFactor(a, c)) * f) as MPaSqrtMm;
}
