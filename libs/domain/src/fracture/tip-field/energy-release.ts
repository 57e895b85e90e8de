import type { MPa, MPaSqrtMm } from '../../units/quantity';
import type { PlaneCondition } from '../stress-state';

/** Elastic constants and how the thickness holds the material. */
export interface ElasticPlane {
  /** Young's modulus, E [MPa]. */
  readonly youngsModulus: MPa;
  /** Poisson's ratio, ν [-]. */
  readonly poisson: number;
  readonly condition: PlaneCondition;
}

/**
 * Modulus of the plane problem: E in plane stress, E/(1 − ν²) in plane strain.
 * @param elastic E, ν and condition [MPa]
 * @returns E′ [MPa]
 * @validity 0 ≤ ν ≤ 0.5
 * @source Hooke's law
 * @example planeModulus({ youngsModulus: mpa(200000), poisson: 0.3, condition: 'plane strain' }) // 219780.21978022
 */
export const planeModulus = ({ youngsModulus, poisson, condition }: ElasticPlane): MPa =>
  (condition === 'plane strain' ? youngsModulus / (1 - poisson ** 2) : youngsModulus) as MPa;

/**
 * Energy release rate, which is the elastic J: G = (KI² + KII²)/E′ + KIII²(1 + ν)/E.
 * @param elastic E, ν and condition [MPa]
 * @param opening KI [MPa·√mm]
 * @param sliding KII [MPa·√mm]
 * @param tearing KIII [MPa·√mm]
 * @returns energy released per area of crack, G = J [N/mm, which is kJ/m²]
 * @validity elastic, the crack growing straight ahead; a crack under KII turns
 * @source Irwin 1957
 * @example energyRelease({ youngsModulus: mpa(200000), poisson: 0.3, condition: 'plane stress' }, mpaSqrtMm(1000)) // 5
 */
export function energyRelease(
  elastic: ElasticPlane,
  opening: MPaSqrtMm,
  sliding = 0 as MPaSqrtMm,
  tearing = 0 as MPaSqrtMm,
): number {
  const plane = (opening ** 2 + sliding ** 2) / planeModulus(elastic);
  return plane + (tearing ** 2 * (1 + elastic.poisson)) / elastic.youngsModulus;
}

/**
 * Stress intensity with the same energy release rate, √(J E′).
 * @param elastic E, ν and condition [MPa]
 * @param energy J or G [N/mm]
 * @returns K [MPa·√mm]
 * @validity J ≥ 0
 * @source Irwin 1957
 * @example intensityOf({ youngsModulus: mpa(200000), poisson: 0.3, condition: 'plane stress' }, 5) // 1000
 */
export const intensityOf = (elastic: ElasticPlane, energy: number): MPaSqrtMm =>
  Math.sqrt(energy * planeModulus(elastic)) as MPaSqrtMm;
