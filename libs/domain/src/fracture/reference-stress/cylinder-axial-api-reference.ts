import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import { bulgingFactor } from './bulging-factor';
import { bendingRelief } from './plate-surface-api-reference';
import type { ReferenceStressSolution } from './solution';

/**
 * Surface bulging factor of an axial part-wall crack: Ms = 1/[1 − a/t + (a/t)/Mt(λa)], λa = 1.818 c/√(Ri a).
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @returns surface factor Ms [-]
 * @validity a/t < 1; 1 % high for a vanishing length, as Mt is
 * @source API 579-1 equation 9C.18 (seen in a secondary source that cites it)
 * @example surfaceBulgingFactor(crackOf({ a: 8, c: 40, t: 25, Ri: 750 })) // 1.050124619
 */
export function surfaceBulgingFactor({ a, c, thickness, insideRadius }: Crack): number {
  const depth = a / thickness;
  const mt = bulgingFactor((1.818 * c) / Math.sqrt(insideRadius * a));
  return 1 / (1 - depth + depth / mt);
}

/**
 * Reference stress of an axial surface crack in a cylinder, less conservative than the form the catalogue
 * uses and kept beside it as a cross check:
 * [g Pb + √((g Pb)² + 9 (Ms Pm (1 − α)²)²)]/[3 (1 − α)²], α = (a/t)/(1 + t/c), g = 1 − 20 (a/2c)^0.75 α³.
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity a/t < 1; Pm ≥ 0, Pb taken without its sign
 * @source API 579-1 equation 9C.85 (seen in a secondary source that cites it)
 * @example cylinderAxialApiReference(crackOf({ a: 8, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)) // 210.0249238
 */
export function cylinderAxialApiReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness } = crack;
  if (!(a < thickness)) return Number.POSITIVE_INFINITY as MPa;
  const alpha = a / thickness / (1 + thickness / c);
  const left = (1 - alpha) ** 2;
  const bent = bendingRelief(crack) * Math.abs(bending);
  const held = 3 * surfaceBulgingFactor(crack) * membrane * left;
  return ((bent + Math.hypot(bent, held)) / (3 * left)) as MPa;
}

export const CYLINDER_AXIAL_API_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-axial-api',
  title: 'Axial surface flaw in a cylinder, second form',
  source: 'API 579-1 equation 9C.85 (seen in a secondary source that cites it)',
  formula:
    'σref = [g Pb + √((g Pb)² + 9 (Ms Pm (1 − α)²)²)]/[3 (1 − α)²], Ms = 1/[1 − a/t + (a/t)/Mt(λa)]',
  basis: 'Local collapse of the ligament with bulging; exact for a vanishing flaw.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: cylinderAxialApiReference,
};
