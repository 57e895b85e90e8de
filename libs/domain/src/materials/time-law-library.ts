import { MPA_SQRT_MM_PER, type StressIntensityUnit } from '../units/exact-factors';
import { toMmPerYear } from '../units/time-rate';
import { inMetres } from './crack-law-scopes';
import type { TimeLaw } from './time-law';

/** Coefficient of a power of K for K in MPa·√mm, from one for K in another unit. */
const perMm = (coefficient: number, exponent: number, unit: StressIntensityUnit): number =>
  coefficient / MPA_SQRT_MM_PER[unit] ** exponent;

/** Laws of growth with time. Where inspections give the plant's own rate, that rate goes before any of them. */
export const TIME_LAWS: readonly TimeLaw[] = [
  {
    form: 'thermal',
    key: 'alloy-600-primary-water',
    title: 'Alloy 600, primary water of a pressurised-water reactor',
    environment: 'primary water',
    source: 'EPRI MRP-55: 2.67e-12 (K − 9)^1.16 m/s at 325 °C, 130 kJ/mol (from memory)',
    coefficient: perMm(toMmPerYear(2.67e-12, 'm', 's'), 1.16, 'MPa·√m'),
    exponent: 1.16,
    activationKJPerMol: 130,
    referenceC: 325,
    thresholdMPaSqrtMm: 9 * MPA_SQRT_MM_PER['MPa·√m'],
    stressIntensityMPaSqrtMm: inMetres([0, 80]),
    temperatureC: [290, 360],
  },
  {
    form: 'power',
    key: 'sensitised-austenitic-boiling-water',
    title: 'Sensitised austenitic steel, boiling-water reactor, normal water chemistry',
    environment: 'oxygenated reactor water',
    source: 'NUREG-0313: 3.590e-8 K^2.161 in/h with ksi·√in (from memory)',
    coefficient: perMm(toMmPerYear(3.59e-8, 'in', 'h'), 2.161, 'ksi·√in'),
    exponent: 2.161,
    plateauMmPerYear: null,
    thresholdMPaSqrtMm: 0,
    stressIntensityMPaSqrtMm: inMetres([0, 80]),
    temperatureC: [200, 300],
  },
];

/** The law of a key, or undefined when the library has none. */
export const timeLaw = (key: string): TimeLaw | undefined =>
  TIME_LAWS.find((law) => law.key === key);
