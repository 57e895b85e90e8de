import type { Crack } from '../../geometry/crack';
import { lameHoopStress } from '../../geometry/pressure-stress';
import { polynomialThrough } from '../../numerics/polynomial-through';
import type { MPa, Mm } from '../../units/quantity';
import type { WallStressAt } from '../weight-function/weighted-stress';
import { termsOf, type StressTerms } from './stress-terms';

// Chebyshev's five points on 0…1: near the least error a quartic can have
const POINTS = [0, 1, 2, 3, 4].map((i) => (1 - Math.cos((Math.PI * (2 * i + 1)) / 10)) / 2);

/**
 * The terms of any stress over the depth of a crack: the quartic through five Chebyshev points of it. Beyond the
 * crack the polynomial means nothing, and K does not ask for it.
 * @param stress stress at x from the flawed face [MPa]
 * @param crack crack and wall: a, t [mm]
 * @returns membrane, bending and higher terms in x/t [MPa]
 * @validity a stress that is smooth over the depth
 * @source interpolation at Chebyshev points
 * @example termsOverDepth((x) => 3 + x, crackOf({ a: 4, c: 9, t: 10 })).bending // -5
 */
export function termsOverDepth(stress: WallStressAt, crack: Crack): StressTerms {
  const depths = POINTS.map((share) => share * crack.a);
  const powers = polynomialThrough(POINTS, depths.map(stress));
  // from (x/a)ⁿ to (x/t)ⁿ
  const stretch = crack.thickness / crack.a;
  return termsOf(powers.map((power, n) => power * stretch ** n));
}

/** Which face of the wall is cracked. */
export type CrackedFace = 'inside' | 'outside';

/**
 * Terms of the hoop stress of a cylinder under internal pressure over the depth of an axial crack, with the
 * pressure on its faces when it opens to the inside: Lamé's stress in a wall of any thickness.
 * @param pressure internal pressure, p [MPa]
 * @param crack crack and wall: a, t, Ri [mm]
 * @param face which face is cracked [-]
 * @returns membrane, bending and higher terms in x/t from the cracked face [MPa]
 * @validity elastic, away from ends; Ri/t ≥ 1: within 0.3 % on K
 * @source Lamé; pressure on the faces by superposition
 * @example pressureHoopTerms(mpa(10), crackOf({ a: 1, c: 9, t: 10, Ri: 100 }), 'inside').membrane // 109.4761905
 */
export function pressureHoopTerms(pressure: MPa, crack: Crack, face: CrackedFace): StressTerms {
  const { insideRadius, thickness } = crack;
  const outsideRadius = (insideRadius + thickness) as Mm;
  const [start, way] = face === 'inside' ? [insideRadius, 1] : [outsideRadius, -1];
  const onFaces = face === 'inside' ? pressure : 0;
  return termsOverDepth(
    (x) => onFaces + lameHoopStress(pressure, insideRadius, outsideRadius, (start + way * x) as Mm),
    crack,
  );
}
