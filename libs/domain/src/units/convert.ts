import {
  MM_PER,
  MPA_PER,
  MPA_SQRT_MM_PER,
  type LengthUnit,
  type StressIntensityUnit,
  type StressUnit,
} from './exact-factors';
import type { Celsius, MPa, MPaSqrtM, MPaSqrtMm, Mm } from './quantity';

/** Length in any listed unit → millimetres. */
export const toMm = (value: number, from: LengthUnit) => (value * MM_PER[from]) as Mm;

/** Millimetres → any listed unit of length. */
export const fromMm = (value: Mm, to: LengthUnit) => value / MM_PER[to];

/** Stress or pressure in any listed unit → megapascals. */
export const toMPa = (value: number, from: StressUnit) => (value * MPA_PER[from]) as MPa;

/** Megapascals → any listed unit of stress or pressure. */
export const fromMPa = (value: MPa, to: StressUnit) => value / MPA_PER[to];

/** Stress intensity in any listed unit → MPa·√mm. */
export const toMPaSqrtMm = (value: number, from: StressIntensityUnit) =>
  (value * MPA_SQRT_MM_PER[from]) as MPaSqrtMm;

/** MPa·√mm → any listed unit of stress intensity. */
export const fromMPaSqrtMm = (value: MPaSqrtMm, to: StressIntensityUnit) =>
  value / MPA_SQRT_MM_PER[to];

/** MPa·√mm → MPa·√m, the unit shown to people. */
export const toMPaSqrtM = (value: number) => (value / MPA_SQRT_MM_PER['MPa·√m']) as MPaSqrtM;

/** Degrees Fahrenheit → degrees Celsius. */
export const fromFahrenheit = (value: number) => ((value - 32) / 1.8) as Celsius;

/** Degrees Celsius → degrees Fahrenheit. */
export const toFahrenheit = (value: Celsius) => value * 1.8 + 32;
