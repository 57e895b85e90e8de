import { generatorFrom, randomGenerator } from './random-generator';
import { MOST_SOBOL_DIMENSIONS, sobolSequence } from './sobol-sequence';

// by a separate program after the published listing
const XOSHIRO = [11520, 0, 5927040, 70819200];

function points(dimensions: number, seed: number, count: number): number[][] {
  const next = sobolSequence(dimensions, seed);
  const into = new Float64Array(dimensions);
  return Array.from({ length: count }, () => {
    next(into);
    return [...into];
  });
}

const draw = (seed: number, count: number) => {
  const { uniform } = randomGenerator(seed);
  return Array.from({ length: count }, uniform);
};

describe('the random generator', () => {
  it('gives the same bits for the same seed, others for another', () => {
    expect(draw(7, 50)).toEqual(draw(7, 50));
    expect(draw(7, 50)).not.toEqual(draw(8, 50));
    expect(draw(2 ** 32 + 1, 5)).not.toEqual(draw(1, 5));
  });

  it('follows the published step: the first numbers from the state 1, 2, 3, 4', () => {
    const { bits } = generatorFrom([1, 2, 3, 4]);
    expect([bits(), bits(), bits(), bits()]).toEqual(XOSHIRO);
  });

  it('spreads evenly, without memory from one number to the next', () => {
    const x = draw(3, 100_000);
    const mean = x.reduce((sum, each) => sum + each, 0) / x.length;
    const variance = x.reduce((sum, each) => sum + (each - mean) ** 2, 0) / x.length;
    const lag = x.slice(1).reduce((sum, each, i) => sum + (each - 0.5) * ((x[i] ?? 0) - 0.5), 0);
    expect(Math.abs(mean - 0.5)).toBeLessThan(4 / Math.sqrt(12 * x.length));
    expect(variance).toBeCloseTo(1 / 12, 3);
    expect(Math.abs(lag / x.length)).toBeLessThan(4 / (12 * Math.sqrt(x.length)));
  });

  it('fills a hundred boxes as chance would: chi-square inside four of its standard deviations', () => {
    const counts = new Array<number>(100).fill(0);
    for (const x of draw(11, 100_000))
      counts[Math.floor(100 * x)] = (counts[Math.floor(100 * x)] ?? 0) + 1;
    const chi2 = counts.reduce((sum, n) => sum + (n - 1000) ** 2 / 1000, 0);
    expect(Math.abs(chi2 - 99)).toBeLessThan(4 * Math.sqrt(2 * 99));
  });
});

describe('the scrambled Sobol sequence', () => {
  it('gives the same points for the same seed, others for another', () => {
    expect(points(3, 5, 20)).toEqual(points(3, 5, 20));
    expect(points(3, 5, 20)).not.toEqual(points(3, 6, 20));
  });

  it('puts exactly one of 2ᵏ points in each of 2ᵏ strips, in every dimension', () => {
    const set = points(MOST_SOBOL_DIMENSIONS, 9, 256);
    for (let k = 0; k < MOST_SOBOL_DIMENSIONS; k++) {
      expect(new Set(set.map((point) => Math.floor(256 * (point[k] ?? 0)))).size).toBe(256);
    }
  });

  it('puts one point in each box of the first two dimensions, whatever the shape of the boxes', () => {
    const set = points(2, 4, 64);
    for (const across of [1, 2, 4, 8, 16, 32, 64]) {
      const boxes = set.map(
        ([x = 0, y = 0]) => `${Math.floor(across * x)} ${Math.floor((64 / across) * y)}`,
      );
      expect(new Set(boxes).size).toBe(64);
    }
  });

  it('integrates a smooth function far better than chance', () => {
    const exact = (Math.E - 1) ** 3;
    const set = points(3, 1, 4096);
    const mean =
      set.reduce((sum, point) => sum + Math.exp(point.reduce((all, x) => all + x, 0)), 0) / 4096;
    expect(Math.abs(mean / exact - 1)).toBeLessThan(1e-4);
  });
});
