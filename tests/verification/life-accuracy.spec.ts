import { combine, type Influence } from '@ligament/domain/fracture/stress-intensity/solution';
import { PLATE_SURFACE_K } from '@ligament/domain/fracture/stress-intensity/plate-surface-k';
import { ratesPerYear, type Rates } from '@ligament/domain/growth/growth-rates';
import { integrateGrowth, type GrowthOptions } from '@ligament/domain/growth/integrate-growth';
import { growthLaw } from '@ligament/domain/materials/growth-laws';
import { degrees } from '@ligament/domain/units/quantity';
import { crackOf } from '@ligament/domain/verification/crack-of';

/** A generator with a seed: the same flaws at every run. */
function generator(seed: number): (low: number, high: number) => number {
  let state = seed;
  return (low, high) => {
    state = (state * 1_664_525 + 1_013_904_223) % 2 ** 32;
    return low + ((high - low) * state) / 2 ** 32;
  };
}

/** One random flaw with a two-stage law, a threshold and two blocks: everything that makes kinks. */
function flawLife(between: ReturnType<typeof generator>) {
  const t = between(10, 60);
  const a = t * between(0.05, 0.3);
  const c = a / between(0.2, 1);
  const [membrane, bending, kMax] = [between(60, 150), between(0, 80), between(3000, 6000)];
  const law = growthLaw('steel-air-high-upper');
  if (!law) throw new Error('law missing');
  const block = (share: number, cyclesPerYear: number) => ({
    membraneRangeMPa: share * membrane,
    bendingRangeMPa: share * bending,
    cyclesPerYear,
  });
  const deepest: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const end: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const take = (depth: number, half: number) => {
    const crack = crackOf({ a: depth, c: half, t });
    PLATE_SURFACE_K.influence(crack, degrees(90), deepest);
    PLATE_SURFACE_K.influence(crack, degrees(0), end);
  };
  const perYear = ratesPerYear(
    { fatigue: { law, blocks: [block(1, 1), block(0.35, 3)] }, stressCorrosion: null },
    { deepest: (m, b) => combine(deepest, m, b), end: (m, b) => combine(end, m, b) },
  );
  const rates = (depth: number, half: number, into: Rates) => {
    take(depth, half);
    perYear(into);
  };
  const highest = (depth: number, half: number) => {
    take(depth, half);
    return Math.max(
      combine(deepest, 2 * membrane, 2 * bending),
      combine(end, 2 * membrane, 2 * bending),
    );
  };
  const limits = [
    { key: 'depth', margin: (depth: number) => 0.8 - depth / t },
    { key: 'toughness', margin: (depth: number, half: number) => kMax - highest(depth, half) },
  ];
  return (options: Partial<GrowthOptions>) => {
    const run = integrateGrowth({ a, c }, rates, limits, { horizonYears: 1e15, ...options });
    return { ...run, years: run.states[run.states.length - 1]?.years ?? Number.NaN };
  };
}

describe('the life of a growing flaw', () => {
  const between = generator(20_261_201);
  const lives = Array.from({ length: 40 }, () => flawLife(between));

  it('agrees with a hundred times shorter steps within 0.05 %, whatever the kinks', () => {
    const errors = lives.map((life) => {
      const exact = life({ tolerance: 1e-9, maxStep: 1e-3 });
      const own = life({});
      expect(own.limit).toBe(exact.limit);
      return Math.abs(own.years / exact.years - 1);
    });
    expect(Math.max(...errors)).toBeLessThan(5e-4);
    expect([...errors].sort((x, y) => x - y)[20]).toBeLessThan(1e-5);
  });

  it('takes some sixty evaluations, twice as many where the kinks are many', () => {
    const evaluations = lives.map((life) => life({}).evaluations);
    const mean = evaluations.reduce((sum, n) => sum + n, 0) / evaluations.length;
    expect(mean).toBeLessThan(65);
    expect(Math.max(...evaluations)).toBeLessThan(140);
  });
});
