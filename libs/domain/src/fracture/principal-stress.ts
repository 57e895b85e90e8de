import type { MPa } from '../units/quantity';
import type { PlaneCondition, PlaneStress } from './stress-state';

/**
 * Larger principal stress in the plane.
 * @param state stress at the point [MPa]
 * @returns first principal stress in the plane [MPa]
 * @validity any plane state
 * @source Mohr's circle
 * @example firstPrincipal({ xx: 80, yy: 20, xy: 40 }) // 100
 */
export function firstPrincipal({ xx, yy, xy }: PlaneStress): MPa {
  return ((xx + yy) / 2 + mohrRadius(xx, yy, xy)) as MPa;
}

/**
 * Smaller principal stress in the plane.
 * @param state stress at the point [MPa]
 * @returns second principal stress in the plane [MPa]
 * @validity any plane state
 * @source Mohr's circle
 * @example secondPrincipal({ xx: 80, yy: 20, xy: 40 }) // 0
 */
export function secondPrincipal({ xx, yy, xy }: PlaneStress): MPa {
  return ((xx + yy) / 2 - mohrRadius(xx, yy, xy)) as MPa;
}

/**
 * Stress across the plane: none in plane stress, ν (σxx + σyy) in plane strain.
 * @param state stress at the point [MPa]
 * @param condition plane stress or plane strain [-]
 * @param poisson Poisson's ratio, ν [-]
 * @returns stress through the thickness [MPa]
 * @validity elastic
 * @source Hooke's law
 * @example throughThickness({ xx: 100, yy: 100, xy: 0 }, 'plane strain', 0.3) // 60
 */
export function throughThickness(
  { xx, yy }: PlaneStress,
  condition: PlaneCondition,
  poisson: number,
): MPa {
  return (condition === 'plane strain' ? poisson * (xx + yy) : 0) as MPa;
}

/**
 * Von Mises equivalent stress of a plane state.
 * @param state stress at the point [MPa]
 * @param condition plane stress or plane strain [-]
 * @param poisson Poisson's ratio, ν; counts in plane strain only [-]
 * @returns equivalent stress [MPa]
 * @validity elastic
 * @source von Mises 1913
 * @example vonMises({ xx: 100, yy: 100, xy: 0 }, 'plane strain', 0.3) // 40
 */
export function vonMises(state: PlaneStress, condition: PlaneCondition, poisson: number): MPa {
  const { xx, yy, xy } = state;
  const zz = throughThickness(state, condition, poisson);
  const apart = (xx - yy) ** 2 + (yy - zz) ** 2 + (zz - xx) ** 2;
  return Math.sqrt(apart / 2 + 3 * xy * xy) as MPa;
}

const mohrRadius = (xx: number, yy: number, xy: number): number =>
  Math.sqrt(((xx - yy) / 2) ** 2 + xy * xy);
