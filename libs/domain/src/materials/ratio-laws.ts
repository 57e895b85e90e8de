import { convertParisCoefficient } from '../units/convert-paris';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import { NO_THRESHOLD, type CrackLaw } from './crack-law';
import { inMetres, scope } from './crack-law-scopes';

const METRIC = { growth: 'mm', range: 'MPa·√m' } as const;
const SOURCE =
  'Dowling, Mechanical Behavior of Materials, table of growth constants (from memory); a mean, not an upper bound';

/** Coefficient in mm/cycle and exponent with ΔK in MPa·√m, exponent γ of Walker, range of ratios seen. */
const WALKER = [
  ['walker-4340', 'Steel AISI 4340, yield 1255 MPa', 5.11e-10, 3.24, 0.42],
  ['walker-17-4ph', 'Steel 17-4 PH, yield 1059 MPa', 3.29e-8, 2.44, 0.79],
  ['walker-2024-t3', 'Aluminium 2024-T3', 1.42e-8, 3.59, 0.68],
  ['walker-7075-t6', 'Aluminium 7075-T6', 2.71e-8, 3.7, 0.641],
] as const;

/** Coefficient with ΔK and Kc in MPa·√m and growth in mm/cycle, exponent, Kc in MPa·√m. */
const FORMAN = [
  ['forman-2024-t3', 'Aluminium 2024-T3, sheet', 2.31e-6, 3.38, 110],
  ['forman-7075-t6', 'Aluminium 7075-T6, sheet', 5.29e-6, 3.21, 78.7],
] as const;

const walker = WALKER.map(([key, title, coefficient, exponent, gamma]): CrackLaw => ({
  form: 'walker',
  key,
  title: `${title}, air, by stress ratio after Walker`,
  environment: 'air',
  source: SOURCE,
  coefficient: convertParisCoefficient(coefficient, exponent, { from: METRIC }),
  exponent,
  gamma,
  threshold: NO_THRESHOLD,
  scope: scope({ range: inMetres([3, 100]), ratio: [-2, 0.8], temperature: [0, 50] }),
}));

const forman = FORMAN.map(([key, title, coefficient, exponent, toughness]): CrackLaw => ({
  form: 'forman',
  key,
  title: `${title}, air, by stress ratio after Forman`,
  environment: 'air',
  source: SOURCE,
  // divided by a range: one power of it less to convert
  coefficient: convertParisCoefficient(coefficient, exponent - 1, { from: METRIC }),
  exponent,
  toughnessMPaSqrtMm: toughness * MPA_SQRT_MM_PER['MPa·√m'],
  threshold: NO_THRESHOLD,
  scope: scope({ range: inMetres([3, toughness]), ratio: [0, 0.8], temperature: [0, 50] }),
}));

/** Laws with the stress ratio inside, for metals whose constants are known by it. */
export const RATIO_LAWS: readonly CrackLaw[] = [...walker, ...forman];
