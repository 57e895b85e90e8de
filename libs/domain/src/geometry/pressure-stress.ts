import type { MPa, Mm } from '../units/quantity';

/** Stress through the wall from pressure, linearised; bending is positive when the bore is in tension. */
export interface WallStress {
  readonly membrane: MPa;
  readonly bending: MPa;
}

/**
 * Membrane hoop stress of a thin cylinder under internal pressure, p Ri/t.
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param thickness wall, t [mm]
 * @returns hoop membrane stress [MPa]
 * @validity any wall for the mean over the wall (equilibrium); thin for the peak
 * @source equilibrium of half a cylinder
 * @example thinHoopStress(mpa(2.6), mm(1300), mm(28)) // 120.7142857
 */
export const thinHoopStress = (pressure: MPa, insideRadius: Mm, thickness: Mm) =>
  ((pressure * insideRadius) / thickness) as MPa;

/**
 * Membrane axial stress of a closed cylinder under internal pressure, p Ri²/(Ro² − Ri²).
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param thickness wall, t [mm]
 * @returns axial membrane stress [MPa]
 * @validity closed ends, away from them; any wall
 * @source equilibrium of the cross section
 * @example axialStress(mpa(10), mm(100), mm(10)) // 47.6190476
 */
export function axialStress(pressure: MPa, insideRadius: Mm, thickness: Mm): MPa {
  const outside = insideRadius + thickness;
  return ((pressure * insideRadius ** 2) / (outside ** 2 - insideRadius ** 2)) as MPa;
}

/**
 * Membrane stress of a closed sphere under internal pressure, p Ri²/(Ro² − Ri²), in every direction.
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param thickness wall, t [mm]
 * @returns membrane stress [MPa]
 * @validity away from nozzles and supports; any wall for the mean over the wall
 * @source equilibrium of half a sphere
 * @example sphereStress(mpa(1.8), mm(8000), mm(45)) // 159.5513
 */
export const sphereStress = axialStress;

/**
 * Hoop stress of a thick cylinder under internal pressure at a radius.
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param outsideRadius outside radius, Ro [mm]
 * @param radius where, r [mm]
 * @returns hoop stress at r [MPa]
 * @validity elastic, away from ends; Ri ≤ r ≤ Ro
 * @source Lamé
 * @example lameHoopStress(mpa(10), mm(100), mm(110), mm(100)) // 105.238095238
 */
export function lameHoopStress(
  pressure: MPa,
  insideRadius: Mm,
  outsideRadius: Mm,
  radius: Mm,
): MPa {
  const share = insideRadius ** 2 / (outsideRadius ** 2 - insideRadius ** 2);
  return (pressure * share * (1 + (outsideRadius / radius) ** 2)) as MPa;
}

/**
 * Hoop stress of a thick cylinder, linearised through the wall in closed form: membrane p Ri/t, bending
 * from the first moment of Lamé's distribution about the middle of the wall.
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param thickness wall, t [mm]
 * @returns membrane and bending hoop stress, bending positive at the bore [MPa]
 * @validity elastic, away from ends
 * @source Lamé; Pb = (6/t²) ∫ σ (t/2 − x) dx with x from the bore
 * @example thickHoopStress(mpa(10), mm(100), mm(10)).bending // 4.990926765
 */
export function thickHoopStress(pressure: MPa, insideRadius: Mm, thickness: Mm): WallStress {
  const outside = insideRadius + thickness;
  const middle = insideRadius + thickness / 2;
  const share = (pressure * insideRadius ** 2) / (outside ** 2 - insideRadius ** 2);
  const membrane = thinHoopStress(pressure, insideRadius, thickness);
  // ∫ σ (rm − r) dr of σ = s (1 + Ro²/r²): the constant part has no moment
  const moment =
    share *
    outside ** 2 *
    (middle * (1 / insideRadius - 1 / outside) - Math.log(outside / insideRadius));
  return { membrane, bending: ((6 * moment) / thickness ** 2) as MPa };
}

/**
 * Wall a thin cylinder needs against pressure, p Ri/(f E − 0.6 p).
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param allowable allowable stress times joint efficiency, f E [MPa]
 * @returns required thickness without corrosion allowance [mm]
 * @validity p ≤ 0.385 f E
 * @source ASME VIII Division 1 UG-27 form (from memory)
 * @example requiredCylinderWall(mpa(2.6), mm(1300), mpa(138)) // 24.7727939
 */
export const requiredCylinderWall = (pressure: MPa, insideRadius: Mm, allowable: MPa) =>
  ((pressure * insideRadius) / (allowable - 0.6 * pressure)) as Mm;

/**
 * Wall a thin sphere needs against pressure, p Ri/(2 f E − 0.2 p).
 * @param pressure internal pressure, p [MPa]
 * @param insideRadius inside radius, Ri [mm]
 * @param allowable allowable stress times joint efficiency, f E [MPa]
 * @returns required thickness without corrosion allowance [mm]
 * @validity p ≤ 0.665 f E
 * @source ASME VIII Division 1 UG-27 form (from memory)
 * @example requiredSphereWall(mpa(1.8), mm(8000), mpa(163)) // 44.2206117
 */
export const requiredSphereWall = (pressure: MPa, insideRadius: Mm, allowable: MPa) =>
  ((pressure * insideRadius) / (2 * allowable - 0.2 * pressure)) as Mm;
