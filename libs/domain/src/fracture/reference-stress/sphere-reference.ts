import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'API 579-1 Annex 9C, sphere (from memory)';

/**
 * Bulging factor of a crack through the wall of a sphere:
 * Mt = (1.0005 + 0.49001 λ + 0.32409 λ²)/(1 + 0.50144 λ − 0.011067 λ²).
 * @param lambda shell parameter, 1.818 c/√(Ri t) [-]
 * @returns bulging factor Mt [-]
 * @validity 0 ≤ λ ≤ 20; 1.0005 without a crack
 * @source API 579-1 Part 9 and Annex 9C, sphere (from memory)
 * @example sphereBulgingFactor(1) // 1.2175475535
 */
export function sphereBulgingFactor(lambda: number): number {
  const above = 1.0005 + (0.49001 + 0.32409 * lambda) * lambda;
  return above / (1 + (0.50144 - 0.011067 * lambda) * lambda);
}

const parameter = (c: number, insideRadius: number, depth: number): number =>
  (1.818 * c) / Math.sqrt(insideRadius * depth);

const held = (factor: number, membrane: MPa, bending: MPa, left = 1): MPa => {
  const pb = Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * factor * membrane * left * left)) / (3 * left * left)) as MPa;
};

/**
 * Reference stress of a crack through the wall of a sphere: [Pb + √(Pb² + 9 (Mt Pm)²)]/3.
 * @param crack crack and wall: c, t, Ri [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity λ ≤ 20; Pm ≥ 0, Pb taken without its sign
 * @source API 579-1 Annex 9C, sphere (from memory)
 * @example sphereThroughWallReference(crackOf({ a: 20, c: 1e-9, t: 20, Ri: 2000 }), mpa(100), mpa(0)) // 100.05
 */
export const sphereThroughWallReference = (
  { c, thickness, insideRadius }: Crack,
  membrane: MPa,
  bending: MPa,
): MPa => held(sphereBulgingFactor(parameter(c, insideRadius, thickness)), membrane, bending);

/**
 * Reference stress of a surface crack in a sphere: [Pb + √(Pb² + 9 (Ms Pm (1 − α)²)²)]/[3 (1 − α)²], with
 * Ms = 1/[1 − a/t + (a/t)/Mt(λa)], λa = 1.818 c/√(Ri a) and α = (a/t)/(1 + t/c).
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity a < t, λa ≤ 20; Pm ≥ 0, Pb taken without its sign
 * @source API 579-1 Annex 9C, sphere, by the form for a cylinder (from memory)
 * @example sphereSurfaceReference(crackOf({ a: 8, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)) // 211.0281084895
 */
export function sphereSurfaceReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness, insideRadius } = crack;
  if (!(a < thickness)) return Number.POSITIVE_INFINITY as MPa;
  const depth = a / thickness;
  const bulging = sphereBulgingFactor(parameter(c, insideRadius, a));
  const surface = 1 / (1 - depth + depth / bulging);
  return held(surface, membrane, bending, 1 - depth / (1 + thickness / c));
}

const LENGTH = (depth: (crack: Crack) => number) => ({
  name: 'λ',
  text: '1.818 c/√(Ri a) ≤ 20, a the wall for a flaw through it',
  min: 0,
  max: 20,
  measure: (crack: Crack) => parameter(crack.c, crack.insideRadius, depth(crack)),
  source: SOURCE,
  input: 'flaw.lengthMm',
  instead: 'Ask a specialist for a shell analysis of this long flaw.',
});

export const SPHERE_THROUGH_WALL_REFERENCE: ReferenceStressSolution = {
  key: 'sphere-through-wall',
  title: 'Flaw through the wall of a sphere',
  source: SOURCE,
  formula: 'σref = [Pb + √(Pb² + 9 (Mt Pm)²)]/3',
  basis: 'Collapse with bulging; the fit of Mt is 0.05 % high for a vanishing flaw.',
  scope: 'global',
  vanishing: 'margin',
  limits: [LENGTH(({ thickness }) => thickness)],
  stress: sphereThroughWallReference,
};

export const SPHERE_SURFACE_REFERENCE: ReferenceStressSolution = {
  key: 'sphere-surface',
  title: 'Surface flaw in a sphere',
  source: SOURCE,
  formula:
    'σref = [Pb + √(Pb² + 9 (Ms Pm (1 − α)²)²)]/[3 (1 − α)²], Ms = 1/[1 − a/t + (a/t)/Mt(λa)]',
  basis: 'Local collapse of the ligament with bulging.',
  scope: 'local',
  vanishing: 'exact',
  limits: [LENGTH(({ a }) => a)],
  stress: sphereSurfaceReference,
};
