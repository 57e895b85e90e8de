import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import type { StressBlock } from '../growth-rates';
import type { CountedCycle } from './rainflow';

/** Cycles of about one range and one mean. */
export interface CycleBin {
  readonly rangeMPa: number;
  readonly meanMPa: number;
  readonly count: number;
}

export interface BinOptions {
  readonly rangeWidthMPa: number;
  readonly meanWidthMPa: number;
  /** Up: every bin stands at its upper edges, on the safe side; centre: at its middle. */
  readonly rounding: 'up' | 'centre';
}

/** The histogram of a counted history, largest range first. */
export interface BinnedCycles {
  readonly status: 'binned';
  readonly bins: readonly CycleBin[];
}

// a range that stands on an edge but for rounding belongs below it
const ON_EDGE = 1e-9;
// keeps the pair of bin numbers in one exact whole number
const STRIDE = 2 ** 24;

/** Gathers counted cycles in bins of range and mean. */
export function binCycles(
  cycles: Iterable<CountedCycle>,
  options: BinOptions,
): BinnedCycles | Refused {
  const broken = outOfBounds([
    width('rangeWidthMPa', 'Width of the bins of range', options.rangeWidthMPa),
    width('meanWidthMPa', 'Width of the bins of mean', options.meanWidthMPa),
  ]);
  if (broken.length > 0) return refused(...broken);
  const counts = new Map<number, number>();
  for (const { range, mean, count } of cycles) {
    const key =
      numberOf(range, options.rangeWidthMPa) * STRIDE +
      numberOf(mean, options.meanWidthMPa) +
      STRIDE / 2;
    counts.set(key, (counts.get(key) ?? 0) + count);
  }
  const bins = [...counts].map(([key, count]) => binOf(key, count, options));
  bins.sort((one, other) => other.rangeMPa - one.rangeMPa || other.meanMPa - one.meanMPa);
  return { status: 'binned', bins };
}

/** Number of the bin whose upper edge is the first that is not below the value. */
const numberOf = (value: number, size: number): number => Math.ceil(value / size - ON_EDGE);

function binOf(key: number, count: number, options: BinOptions): CycleBin {
  const { rangeWidthMPa, meanWidthMPa, rounding } = options;
  const range = Math.floor(key / STRIDE);
  const mean = key - range * STRIDE - STRIDE / 2;
  const back = rounding === 'up' ? 0 : 0.5;
  return {
    rangeMPa: (range - back) * rangeWidthMPa,
    meanMPa: (mean - back) * meanWidthMPa,
    count,
  };
}

const width = (input: string, name: string, value: number) => ({
  input,
  name,
  unit: 'MPa',
  value,
  min: 0.05,
  max: 1e5,
  instead: 'Give a width such as 5 MPa.',
});

/**
 * Minimum over maximum of a cycle from its range and mean; undefined when even the maximum is not tensile.
 */
export function ratioOf({ rangeMPa, meanMPa }: Omit<CycleBin, 'count'>): number | undefined {
  const most = meanMPa + rangeMPa / 2;
  return most > 0 ? (meanMPa - rangeMPa / 2) / most : undefined;
}

/** The bins as blocks of membrane stress for the growth, with so many histories a year. */
export const blocksOf = (
  bins: readonly CycleBin[],
  historiesPerYear: number,
): readonly StressBlock[] =>
  bins.map((bin) => {
    const stressRatio = ratioOf(bin);
    return {
      membraneRangeMPa: bin.rangeMPa,
      bendingRangeMPa: 0,
      cyclesPerYear: bin.count * historiesPerYear,
      ...(stressRatio === undefined ? {} : { stressRatio }),
    };
  });
