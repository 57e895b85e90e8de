import { outOfBounds, refused, type Refusal, type Refused } from '../geometry/refusal';

/** One thickness measured at one place. */
export interface ThicknessReading {
  /** Time of the reading [years], from any common day. */
  readonly years: number;
  readonly thicknessMm: number;
}

/** Corrosion rates of one place and which of them counts. */
export interface CorrosionRates {
  readonly status: 'measured';
  /** From the last two readings [mm/year]. */
  readonly shortTermMmPerYear: number;
  /** From the first and the last reading [mm/year]. */
  readonly longTermMmPerYear: number;
  /** The greater of the two, never below 0 [mm/year]. */
  readonly governingMmPerYear: number;
  readonly governs: 'short term' | 'long term' | 'none: no loss measured';
}

/**
 * Short- and long-term corrosion rate from readings in the order of time; the greater governs (API 510 and
 * API 570, from memory).
 */
export function corrosionRates(readings: readonly ThicknessReading[]): CorrosionRates | Refused {
  const refusals = refusalsOf(readings);
  const [first, last, before] = [readings[0], readings.at(-1), readings.at(-2)];
  if (refusals.length > 0 || !first || !last || !before) return refused(...refusals);
  const shortTermMmPerYear = rate(before, last);
  const longTermMmPerYear = rate(first, last);
  const greater = Math.max(shortTermMmPerYear, longTermMmPerYear);
  return {
    status: 'measured',
    shortTermMmPerYear,
    longTermMmPerYear,
    governingMmPerYear: Math.max(greater, 0),
    governs:
      greater <= 0
        ? 'none: no loss measured'
        : shortTermMmPerYear >= longTermMmPerYear
          ? 'short term'
          : 'long term',
  };
}

const rate = (from: ThicknessReading, to: ThicknessReading) =>
  (from.thicknessMm - to.thicknessMm) / (to.years - from.years);

/** Time until the wall is thinner than it may be. */
export type ThinningLife =
  | { readonly status: 'life'; readonly years: number }
  /** At or below the required thickness: due now, whatever the rate. */
  | { readonly status: 'overdue'; readonly because: string }
  /** No loss is measured, so no end is in sight. */
  | { readonly status: 'no loss' }
  | Refused;

/** Remaining life of a thinning wall: (actual − required thickness) over the rate. */
export function thinningLife(
  actualMm: number,
  requiredMm: number,
  rateMmPerYear: number,
): ThinningLife {
  const refusals = outOfBounds([
    thickness('actualMm', 'Actual thickness', actualMm),
    thickness('requiredMm', 'Required thickness', requiredMm),
    {
      input: 'rateMmPerYear',
      name: 'Corrosion rate',
      unit: 'mm/year',
      value: rateMmPerYear,
      min: 0,
      max: 100,
      instead: 'Give the loss per year in millimetres, not below 0.',
    },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  if (actualMm <= requiredMm) {
    return {
      status: 'overdue',
      because: `The wall is ${actualMm} mm thick, ${requiredMm} mm are required.`,
    };
  }
  if (rateMmPerYear === 0) return { status: 'no loss' };
  return { status: 'life', years: (actualMm - requiredMm) / rateMmPerYear };
}

function refusalsOf(readings: readonly ThicknessReading[]): readonly Refusal[] {
  const numbers = outOfBounds(
    readings.flatMap(({ years, thicknessMm }, i) => [
      thickness(`readings.${i}.thicknessMm`, 'Thickness', thicknessMm),
      {
        input: `readings.${i}.years`,
        name: 'Time of the reading',
        unit: 'years',
        value: years,
        min: -200,
        max: 3000,
        instead: 'Give the time in years.',
      },
    ]),
  );
  if (readings.length < 2) return [...numbers, tooFew(readings.length)];
  const late = readings.findIndex(
    ({ years }, i) => i > 0 && years <= (readings[i - 1]?.years ?? 0),
  );
  return numbers.length > 0 || late < 0 ? numbers : [notLater(late, readings[late]?.years ?? 0)];
}

const thickness = (input: string, name: string, value: number) => ({
  input,
  name,
  unit: 'mm',
  value,
  min: 0,
  max: 1000,
  above: true,
  instead: 'Give it in millimetres.',
});

const tooFew = (got: number): Refusal => ({
  input: 'readings',
  limit: 'at least two readings',
  value: got,
  message: `${got} readings give no rate.`,
  instead: 'Use a rate from like service until there is a second reading.',
});

const notLater = (i: number, years: number): Refusal => ({
  input: `readings.${i}.years`,
  limit: 'later than the reading before',
  value: years,
  message: `The reading at ${years} years is not later than the one before it.`,
  instead: 'Put the readings in the order of time.',
});
