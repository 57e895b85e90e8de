import type { MPa, MPaSqrtMm, Mm } from '../../units/quantity';
import type { PlaneCondition } from '../stress-state';

// yield ahead of the tip is raised √3 times where the thickness holds the material
const HELD = 3;

/**
 * First-order radius of the plastic zone: (K/σy)²/2π in plane stress, (K/σy)²/6π in plane strain.
 * @param intensity K [MPa·√mm]
 * @param yieldStrength σy [MPa]
 * @param condition plane stress or plane strain [-]
 * @returns radius r_y [mm]
 * @validity small against crack, ligament and thickness
 * @source Irwin 1960
 * @example plasticRadius(mpaSqrtMm(1000), mpa(400), 'plane stress') // 0.9947183943
 */
export function plasticRadius(
  intensity: MPaSqrtMm,
  yieldStrength: MPa,
  condition: PlaneCondition,
): Mm {
  const radius = (intensity / yieldStrength) ** 2 / (2 * Math.PI);
  return (condition === 'plane strain' ? radius / HELD : radius) as Mm;
}

/**
 * Extent of the plastic zone ahead of the tip once the stress it sheds is carried: twice the radius.
 * @param intensity K [MPa·√mm]
 * @param yieldStrength σy [MPa]
 * @param condition plane stress or plane strain [-]
 * @returns extent 2 r_y [mm]
 * @validity small against crack, ligament and thickness
 * @source Irwin 1960
 * @example plasticExtent(mpaSqrtMm(1000), mpa(400), 'plane stress') // 1.9894367886
 */
export const plasticExtent = (
  intensity: MPaSqrtMm,
  yieldStrength: MPa,
  condition: PlaneCondition,
): Mm => (2 * plasticRadius(intensity, yieldStrength, condition)) as Mm;

/**
 * Length of the yielded strip ahead of the tip, π/8 (K/σy)².
 * @param intensity K [MPa·√mm]
 * @param yieldStrength σy [MPa]
 * @returns length of the strip [mm]
 * @validity plane stress; stress far away small against yield
 * @source Dugdale 1960, limit of small stress
 * @example yieldedStrip(mpaSqrtMm(400), mpa(400)) // 0.3926990817
 */
export const yieldedStrip = (intensity: MPaSqrtMm, yieldStrength: MPa): Mm =>
  ((Math.PI / 8) * (intensity / yieldStrength) ** 2) as Mm;

/**
 * Size that crack, ligament and thickness must reach for small-scale yielding, 2.5 (K/σy)².
 * @param intensity K [MPa·√mm]
 * @param yieldStrength σy [MPa]
 * @returns least size [mm]
 * @validity elastic K
 * @source ASTM E399
 * @example leastElasticSize(mpaSqrtMm(400), mpa(400)) // 2.5
 */
export const leastElasticSize = (intensity: MPaSqrtMm, yieldStrength: MPa): Mm =>
  (2.5 * (intensity / yieldStrength) ** 2) as Mm;
