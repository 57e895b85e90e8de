import fc from 'fast-check';
import { binCycles, blocksOf, ratioOf } from './bin-cycles';
import { countHistory, type History } from './count-history';
import { rainflowCounter, type CountedCycle } from './rainflow';
import { turningPoints } from './turning-points';

const STANDARD = [-2, 1, -3, 5, -1, 3, -4, 4, -2];

function counted(history: History, deadBandMPa = 0): readonly CountedCycle[] {
  const outcome = countHistory(history, { deadBandMPa });
  if (outcome.status === 'refused') throw new Error(outcome.refusals[0]?.message);
  return outcome.cycles;
}

function turnsOf(history: readonly number[], deadBand = 0): readonly number[] {
  const turns: number[] = [];
  const points = turningPoints(deadBand, (value) => turns.push(value));
  history.forEach(points.push);
  points.end();
  return turns;
}

/** Sum of n·range: half the way the history goes up and down. */
const travel = (cycles: readonly CountedCycle[]) =>
  cycles.reduce((sum, { range, count }) => sum + 2 * count * range, 0);
const stresses = fc.array(fc.integer({ min: -500, max: 500 }), { minLength: 2, maxLength: 80 });
const moving = stresses.filter((values) => new Set(values).size > 1);

describe('turning points', () => {
  it('leave out what lies on the way', () => {
    expect(turnsOf([0, 1, 2, 2, 5, 3, 3, 4, 4])).toEqual([0, 5, 3, 4]);
  });

  it('leave out swings within the dead band', () => {
    expect(turnsOf([0, 10, 8, 12, 0, 1, -1, 9], 2)).toEqual([0, 12, -1, 9]);
  });

  it('begin at the lowest or highest of a quiet start', () => {
    expect(turnsOf([5, 4, 6, 20], 3)).toEqual([4, 20]);
    expect(turnsOf([5, 6, 4, -20], 3)).toEqual([6, -20]);
  });

  it('are none where nothing moves', () => {
    expect(turnsOf([3, 3, 3])).toEqual([]);
    expect(turnsOf([3, 4, 3.5], 2)).toEqual([]);
  });

  it('alternate and differ by more than the dead band', () => {
    fc.assert(
      fc.property(stresses, fc.integer({ min: 0, max: 100 }), (history, band) => {
        const turns = turnsOf(history, band);
        const steps = turns.slice(1).map((turn, i) => turn - (turns[i] ?? 0));
        expect(steps.every((step) => Math.abs(step) > band)).toBe(true);
        expect(steps.slice(1).every((step, i) => step * (steps[i] ?? 0) < 0)).toBe(true);
      }),
    );
  });
});

describe('rainflow counting', () => {
  it('counts the history of the standard in its order', () => {
    expect(counted(STANDARD)).toEqual([
      { range: 3, mean: -0.5, count: 0.5 },
      { range: 4, mean: -1, count: 0.5 },
      { range: 4, mean: 1, count: 1 },
      { range: 8, mean: 1, count: 0.5 },
      { range: 9, mean: 0.5, count: 0.5 },
      { range: 8, mean: 0, count: 0.5 },
      { range: 6, mean: 1, count: 0.5 },
    ]);
  });

  it('keeps the way of the history: twice the sum of n·range is all its ups and downs', () => {
    fc.assert(
      fc.property(moving, (history) => {
        const way = history
          .slice(1)
          .reduce((sum, x, i) => sum + Math.abs(x - (history[i] ?? 0)), 0);
        expect(travel(counted(history))).toBeCloseTo(way, 6);
      }),
    );
  });

  it('does not see points on the way between two others', () => {
    fc.assert(
      fc.property(moving, fc.double({ min: 0, max: 1, noNaN: true }), (history, share) => {
        const filled = history.flatMap((x, i) => {
          const next = history[i + 1] ?? x;
          return [x, x + share * (next - x)];
        });
        expect(counted(filled)).toEqual(counted(history));
      }),
    );
  });

  it('counts the largest swing, and none above it', () => {
    fc.assert(
      fc.property(moving, (history) => {
        const largest = Math.max(...counted(history).map(({ range }) => range));
        expect(largest).toBe(Math.max(...history) - Math.min(...history));
      }),
    );
  });

  it('counts the mirrored history alike, with the means mirrored', () => {
    fc.assert(
      fc.property(moving, (history) => {
        const mirrored = counted(history.map((x) => -x));
        expect(mirrored.map(({ range }) => range)).toEqual(
          counted(history).map(({ range }) => range),
        );
        expect(mirrored.map(({ mean }) => -mean + 0)).toEqual(
          counted(history).map(({ mean }) => mean + 0),
        );
      }),
    );
  });

  it('takes a million points, also when no cycle ever closes', () => {
    const size = 1_000_000;
    const closing = Float64Array.from({ length: size }, (_, i) => 100 * Math.sin(i * i));
    expect(counted(closing).length).toBeGreaterThan(300_000);
    let halves = 0;
    const counter = rainflowCounter(() => (halves += 1));
    for (let i = 0; i < size; i++) counter.push((i % 2 ? 1 : -1) * (size - i));
    counter.end();
    expect(halves).toBe(size - 1);
  });

  it.each([
    ['nothing', [], /0 values/],
    ['one value', [5], /1 value;/],
    ['a value that is none', [1, Number.NaN, 3], /Value 2/],
    ['an infinite value', [1, 2, Infinity], /Value 3/],
    ['stresses in pascals', [1, 2e8], /Value 2/],
    ['a constant', [4, 4, 4, 4], /no cycle/],
  ])('refuses %s by name', (_, history, message) => {
    const outcome = countHistory(history);
    expect(outcome).toMatchObject({ status: 'refused' });
    if (outcome.status === 'refused') expect(outcome.refusals[0]?.message).toMatch(message);
  });

  it('refuses a dead band below 0', () => {
    expect(countHistory([0, 1], { deadBandMPa: -1 })).toMatchObject({ status: 'refused' });
  });
});

describe('bins of range and mean', () => {
  const options = { rangeWidthMPa: 10, meanWidthMPa: 20, rounding: 'up' } as const;

  it('never lose a cycle, and rounded up never lose range or mean', () => {
    fc.assert(
      fc.property(moving, (history) => {
        const cycles = counted(history);
        const outcome = binCycles(cycles, options);
        if (outcome.status === 'refused') throw new Error('refused');
        const all = (list: readonly { readonly count: number }[]) =>
          list.reduce((sum, { count }) => sum + count, 0);
        expect(all(outcome.bins)).toBeCloseTo(all(cycles), 9);
        const before = cycles.reduce((sum, { range, count }) => sum + count * range, 0);
        const after = outcome.bins.reduce((sum, bin) => sum + bin.count * bin.rangeMPa, 0);
        expect(after).toBeGreaterThanOrEqual(before - 1e-6);
        expect(after).toBeLessThanOrEqual(before + 10 * all(cycles));
      }),
    );
  });

  it('stand at upper edges or in the middle', () => {
    const cycles: CountedCycle[] = [
      { range: 33, mean: -25, count: 1 },
      { range: 40, mean: -20, count: 0.5 },
      { range: 41, mean: 5, count: 1 },
    ];
    expect(binCycles(cycles, options)).toMatchObject({
      bins: [
        { rangeMPa: 50, meanMPa: 20, count: 1 },
        { rangeMPa: 40, meanMPa: -20, count: 1.5 },
      ],
    });
    expect(binCycles(cycles, { ...options, rounding: 'centre' })).toMatchObject({
      bins: [
        { rangeMPa: 45, meanMPa: 10, count: 1 },
        { rangeMPa: 35, meanMPa: -30, count: 1.5 },
      ],
    });
  });

  it.each([0, -5, Number.NaN, Infinity])('refuse a width of %d', (rangeWidthMPa) => {
    expect(binCycles([], { ...options, rangeWidthMPa })).toMatchObject({ status: 'refused' });
  });

  it('become blocks with the stress ratio of each', () => {
    const bins = [
      { rangeMPa: 100, meanMPa: 150, count: 2 },
      { rangeMPa: 50, meanMPa: -80, count: 1 },
    ];
    expect(ratioOf({ rangeMPa: 100, meanMPa: 150 })).toBeCloseTo(0.5, 12);
    expect(blocksOf(bins, 12)).toEqual([
      { membraneRangeMPa: 100, bendingRangeMPa: 0, cyclesPerYear: 24, stressRatio: 0.5 },
      // wholly in compression: no ratio to give
      { membraneRangeMPa: 50, bendingRangeMPa: 0, cyclesPerYear: 12 },
    ]);
  });
});
