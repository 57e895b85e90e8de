import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';

/** A wall as measured at a time; years count from any one day. */
export interface WallReading {
  readonly years: number;
  readonly wallMm: number;
}

/** Loss of wall between readings, and the larger one, which governs. */
export interface CorrosionRate {
  readonly status: 'found';
  /** Between the last two readings [mm/year]. */
  readonly shortTermMmPerYear: number;
  /** Between the first and the last reading [mm/year]. */
  readonly longTermMmPerYear: number;
  readonly governingMmPerYear: number;
  readonly governs: 'short term' | 'long term';
  readonly cautions: readonly string[];
}

export type CorrosionLife =
  | { readonly status: 'found'; readonly years: number }
  /** The wall is at or below what is required: overdue, not a negative time. */
  | { readonly status: 'overdue'; readonly missingMm: number }
  | { readonly status: 'no corrosion' };

const THICKER =
  'A later reading is thicker than an earlier one: check place and procedure before the rate is used.';

/** Corrosion rate from readings in the order of time, at least two (API 510 and 570, from memory). */
export function corrosionRate(readings: readonly WallReading[]): CorrosionRate | Refused {
  const broken = readingRefusals(readings);
  const [first, last] = [readings[0], readings[readings.length - 1]];
  const before = readings[readings.length - 2];
  if (!first || !last || !before || broken.length > 0) return refused(...broken);
  const short = lossRate(before, last);
  const long = lossRate(first, last);
  return {
    status: 'found',
    shortTermMmPerYear: short,
    longTermMmPerYear: long,
    governingMmPerYear: Math.max(short, long, 0),
    governs: short > long ? 'short term' : 'long term',
    cautions: Math.min(short, long) < 0 ? [THICKER] : [],
  };
}

/** Years until a wall has come down to what is required, (t − t_req)/rate. */
export function corrosionLife(
  wallMm: number,
  requiredMm: number,
  rateMmPerYear: number,
): CorrosionLife | Refused {
  const broken = outOfBounds([
    wallRule('wallMm', 'Wall', wallMm),
    wallRule('requiredMm', 'Required wall', requiredMm),
    {
      input: 'rateMmPerYear',
      name: 'Corrosion rate',
      unit: 'mm/year',
      value: rateMmPerYear,
      min: 0,
      max: 1000,
      instead: 'Give the governing rate in mm a year.',
    },
  ]);
  if (broken.length > 0) return refused(...broken);
  if (wallMm <= requiredMm) return { status: 'overdue', missingMm: requiredMm - wallMm };
  if (rateMmPerYear === 0) return { status: 'no corrosion' };
  return { status: 'found', years: (wallMm - requiredMm) / rateMmPerYear };
}

const lossRate = (from: WallReading, to: WallReading): number =>
  (from.wallMm - to.wallMm) / (to.years - from.years);

const wallRule = (input: string, name: string, value: number) => ({
  input,
  name,
  unit: 'mm',
  value,
  min: 0,
  max: 2000,
  above: true,
  instead: 'Give the thickness in millimetres.',
});

function readingRefusals(readings: readonly WallReading[]): readonly Refusal[] {
  if (readings.length < 2) return [tooFew(readings.length)];
  return readings.flatMap(({ years, wallMm }, i) => {
    const before = readings[i - 1]?.years;
    return outOfBounds([
      wallRule(`readings.${i}.wallMm`, `Wall of reading ${i + 1}`, wallMm),
      {
        input: `readings.${i}.years`,
        name: `Time of reading ${i + 1}`,
        unit: 'years',
        value: years,
        min: before !== undefined && Number.isFinite(before) ? before : -1e4,
        max: 1e4,
        above: before !== undefined,
        instead: 'Give the readings in the order of time, no two at once.',
      },
    ]);
  });
}

const tooFew = (length: number): Refusal => ({
  input: 'readings',
  limit: 'at least 2 readings',
  value: length,
  message: `A rate needs two readings of the wall; ${length === 1 ? 'there is one' : 'there is none'}.`,
  instead: 'Give an earlier reading, or a rate from like service.',
});
