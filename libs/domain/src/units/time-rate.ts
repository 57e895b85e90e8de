import { MM_PER, type LengthUnit } from './exact-factors';

/** Seconds in one unit of time; the year is the Julian year of 365.25 days. */
export const SECONDS_PER = { s: 1, h: 3600, day: 86_400, year: 365.25 * 86_400 } as const;
export type TimeUnit = keyof typeof SECONDS_PER;

/** A rate of growth in any listed units → mm/year. */
export const toMmPerYear = (value: number, length: LengthUnit, time: TimeUnit): number =>
  (value * MM_PER[length] * SECONDS_PER.year) / SECONDS_PER[time];

/** mm/year → a rate of growth in any listed units. */
export const fromMmPerYear = (value: number, length: LengthUnit, time: TimeUnit): number =>
  (value * SECONDS_PER[time]) / (MM_PER[length] * SECONDS_PER.year);
