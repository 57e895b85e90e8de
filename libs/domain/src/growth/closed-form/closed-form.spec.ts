import fc from 'fast-check';
import { transition, type GrowthLaw } from '../growth-law';
import { equivalentRange, minerSum, rangeSum } from '../spectrum/equivalent-range';
import { rayleighMoment, weibullMoment } from '../spectrum/range-moments';
import { blockByBlock } from './block-by-block';
import { lifeAtConstantShape, sizeAtConstantShape } from './constant-shape';
import { cycleByCycle } from './cycle-by-cycle';
import { lifeIntegral, sizeOfIntegral } from './power-life';
import { cyclesThroughStages, sizeAtRange, sizeThroughStages } from './stage-life';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const LOWER = { coefficient: 2.1e-17, exponent: 5.1 };
const UPPER = { coefficient: 1.29e-12, exponent: 2.88 };
const TWO_STAGES: GrowthLaw = { stages: [LOWER, UPPER], thresholdMPaSqrtMm: 0 };
const paris = (coefficient: number, exponent: number, thresholdMPaSqrtMm = 0): GrowthLaw => ({
  stages: [{ coefficient, exponent }],
  thresholdMPaSqrtMm,
});

describe('the integral of a power law', () => {
  it('becomes the logarithm at m = 2 without a jump', () => {
    const log = Math.log(10);
    for (const off of [0, 1e-13, -1e-13, 1e-11, -1e-11, 1e-8, -1e-8]) {
      const value = lifeIntegral(2 + off, 2, 20);
      expect(Math.abs(value / log - 1)).toBeLessThan(Math.abs(off) * 5 + 1e-14);
      expect(sizeOfIntegral(2 + off, 2, value)).toBeCloseTo(20, 9);
    }
  });

  it('comes back to the size it came from', () => {
    fc.assert(
      fc.property(between(1, 8), between(0.1, 10), between(1, 20), (m, from, times) => {
        const value = lifeIntegral(m, from, from * times);
        expect(sizeOfIntegral(m, from, value) / (from * times)).toBeCloseTo(1, 6);
      }),
    );
  });

  it('knows no size beyond the infinite one', () => {
    // ∫ a^-2 da from 2 to infinity is 0.5
    expect(sizeOfIntegral(4, 2, 0.5)).toBe(Infinity);
    expect(sizeOfIntegral(4, 2, 0.499)).toBeCloseTo(1000, 6);
    expect(sizeOfIntegral(1, 2, 1e6)).toBeGreaterThan(1e10);
  });
});

describe('life through the stages of a law', () => {
  const drive = 1.12 * 40;
  const split = sizeAtRange(transition(LOWER, UPPER), drive);

  it('is the sum of its parts', () => {
    const whole = cyclesThroughStages(TWO_STAGES, drive, [1, 20]);
    const parts =
      cyclesThroughStages(paris(LOWER.coefficient, LOWER.exponent), drive, [1, split]) +
      cyclesThroughStages(paris(UPPER.coefficient, UPPER.exponent), drive, [split, 20]);
    expect(split).toBeGreaterThan(1);
    expect(whole / parts).toBeCloseTo(1, 12);
  });

  it('gives the size back, on either side of the transition', () => {
    for (const to of [1.5, split, split * 1.01, 15]) {
      const cycles = cyclesThroughStages(TWO_STAGES, drive, [1, to]);
      expect(sizeThroughStages(TWO_STAGES, drive, 1, cycles) / to).toBeCloseTo(1, 9);
    }
  });

  it('agrees with single cycles added up', () => {
    const rate = (a: number) => {
      const range = 120 * Math.sqrt(Math.PI * a);
      return 1e-10 * range ** 3;
    };
    const counted = cycleByCycle(2, rate, (a) => a >= 10);
    const closed = cyclesThroughStages(paris(1e-10, 3), 120, [2, 10]);
    expect(Math.abs(counted.cycles / closed - 1)).toBeLessThan(0.005);
  });

  it('never gets longer by a larger flaw, stress or shape factor', () => {
    fc.assert(
      fc.property(
        between(0.5, 5),
        between(0, 5),
        between(20, 200),
        between(0, 50),
        (a, da, s, ds) => {
          const life = (from: number, stress: number) =>
            cyclesThroughStages(TWO_STAGES, stress, [from, 20]);
          expect(life(a + da, s)).toBeLessThanOrEqual(life(a, s));
          expect(life(a, s + ds)).toBeLessThanOrEqual(life(a, s) * (1 + 1e-12));
        },
      ),
    );
  });
});

describe('life at constant shape', () => {
  const shape = { shapeFactor: 1.12, stressRangeMPa: 80 };

  it('is found, and its inverse with it', () => {
    const life = lifeAtConstantShape(paris(5.21e-13, 3), shape, { fromMm: 2, toMm: 20 });
    expect(life).toMatchObject({ status: 'found' });
    if (life.status !== 'found') return;
    const { cycles } = life;
    const size = sizeAtConstantShape(paris(5.21e-13, 3), shape, { fromMm: 2, cycles });
    expect(size.status === 'found' ? size.sizeMm : 0).toBeCloseTo(20, 8);
  });

  it('is none below the threshold', () => {
    const law = paris(5.21e-13, 3, 400);
    expect(lifeAtConstantShape(law, shape, { fromMm: 2, toMm: 20 })).toEqual({
      status: 'below threshold',
    });
    expect(sizeAtConstantShape(law, shape, { fromMm: 2, cycles: 100 })).toEqual({
      status: 'below threshold',
      sizeMm: 2,
    });
  });

  it('says when the cycles are more than any size takes', () => {
    const size = sizeAtConstantShape(paris(5.21e-13, 3), shape, { fromMm: 2, cycles: 1e9 });
    expect(size).toEqual({ status: 'beyond any size' });
  });

  it.each([
    ['fromMm', { ...shape, fromMm: 0, toMm: 5 }],
    ['fromMm', { ...shape, fromMm: Number.NaN, toMm: 5 }],
    ['toMm', { ...shape, fromMm: 6, toMm: 5 }],
    ['toMm', { ...shape, fromMm: 6, toMm: Infinity }],
    ['stressRangeMPa', { ...shape, stressRangeMPa: -80, fromMm: 2, toMm: 5 }],
    ['stressRangeMPa', { ...shape, stressRangeMPa: 80e6, fromMm: 2, toMm: 5 }],
    ['shapeFactor', { ...shape, shapeFactor: 0, fromMm: 2, toMm: 5 }],
  ])('refuses an impossible %s', (input, { fromMm, toMm, ...load }) => {
    const outcome = lifeAtConstantShape(paris(5.21e-13, 3), load, { fromMm, toMm });
    expect(outcome).toMatchObject({ status: 'refused', refusals: [{ input }] });
  });

  it('refuses cycles below 0', () => {
    const outcome = sizeAtConstantShape(paris(1e-13, 3), shape, { fromMm: 2, cycles: -1 });
    expect(outcome).toMatchObject({ status: 'refused', refusals: [{ input: 'cycles' }] });
  });
});

describe('a programme of blocks', () => {
  const blocks = [
    { rangeMPa: 120, count: 100 },
    { rangeMPa: 80, count: 1000 },
    { rangeMPa: 40, count: 10_000 },
  ];
  const sizes = { fromMm: 2, toMm: 20 };

  it('does as much as its equivalent range, in any order', () => {
    const law = paris(5.21e-13, 3);
    const closed = cyclesThroughStages(law, 1.12 * equivalentRange(blocks, 3), [2, 20]) / 11_100;
    for (const programme of [blocks, [...blocks].reverse()]) {
      const run = blockByBlock(law, 1.12, programme, sizes);
      expect(run).toMatchObject({ status: 'reached', programmes: Math.floor(closed) });
      const done = programme.map((block, i) => ({
        ...block,
        count: i < run.block ? block.count : i === run.block ? run.cyclesOfBlock : 0,
      }));
      const share = rangeSum(done, 3) / rangeSum(blocks, 3);
      expect(run.programmes + share).toBeCloseTo(closed, 7);
    }
  });

  it('leaves out what is below the threshold until the flaw has grown', () => {
    const bare = blockByBlock(paris(5.21e-13, 3), 1, blocks, sizes);
    const held = blockByBlock(paris(5.21e-13, 3, 150), 1, blocks, sizes);
    expect(held.programmes).toBeGreaterThan(bare.programmes);
  });

  it('stands still where no block grows', () => {
    const run = blockByBlock(paris(5.21e-13, 3, 5000), 1, blocks, sizes);
    expect(run).toMatchObject({ status: 'no growth', sizeMm: 2 });
  });

  it('stops at the limit of programmes', () => {
    const run = blockByBlock(paris(5.21e-13, 3), 1, blocks, sizes, { maxProgrammes: 3 });
    expect(run).toMatchObject({ status: 'programme limit', programmes: 3 });
  });
});

describe('spectra', () => {
  it('add up by Miner, harmless ranges as nothing', () => {
    const life = (range: number) => (range < 50 ? Infinity : 1e12 / range ** 3);
    const sum = minerSum(
      [
        { rangeMPa: 100, count: 5e5 },
        { rangeMPa: 40, count: 1e9 },
      ],
      life,
    );
    expect(sum).toBeCloseTo(0.5, 12);
  });

  it('have no equivalent range without a cycle', () => {
    expect(equivalentRange([], 3)).toBe(0);
    expect(equivalentRange([{ rangeMPa: 5, count: 0 }], 3)).toBe(0);
  });

  it('have the moments of a sum over many classes', () => {
    const moment = (density: (x: number) => number) => {
      let sum = 0;
      for (let x = 0.05; x < 2000; x += 0.1) sum += 0.1 * x ** 3 * density(x);
      return sum;
    };
    const s = 20;
    const rayleigh = moment((x) => {
      const scale = 2 * Math.SQRT2 * s;
      return ((2 * x) / scale ** 2) * Math.exp(-((x / scale) ** 2));
    });
    expect(rayleighMoment(s, 3) / rayleigh).toBeCloseTo(1, 5);
    // an exponential distribution is Weibull with shape 1
    expect(weibullMoment(10, 1, 3)).toBeCloseTo(6000, 6);
  });
});

describe('counting single cycles', () => {
  it('ends by its limit or where nothing grows', () => {
    expect(
      cycleByCycle(
        1,
        () => 0,
        (a) => a > 2,
      ),
    ).toMatchObject({ status: 'no growth' });
    const options = { maxCycles: 10 };
    expect(
      cycleByCycle(
        1,
        () => 0.01,
        (a) => a > 2,
        options,
      ),
    ).toMatchObject({
      status: 'cycle limit',
      cycles: 10,
    });
  });
});
