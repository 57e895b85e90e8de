import fc from 'fast-check';
import { growthPerCycle, transition } from './growth-law';
import { ratesPerYear, type Drivers } from './growth-rates';
import { integrateGrowth, type GrowthLimit } from './integrate-growth';
import { becomesSurface, proximityMargin, surfaceDepth } from './recategorise';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const LOWER = { coefficient: 2.1e-17, exponent: 5.1 };
const UPPER = { coefficient: 1.29e-12, exponent: 2.88 };

describe('growthPerCycle', () => {
  it('meets at the transition without a jump', () => {
    const rate = growthPerCycle({ stages: [LOWER, UPPER], thresholdMPaSqrtMm: 0 });
    const at = transition(LOWER, UPPER);
    expect(rate(at * (1 + 1e-9)) / rate(at * (1 - 1e-9))).toBeCloseTo(1, 7);
    expect(at).toBeCloseTo(143.6, 0);
  });

  it('is nothing below the threshold and whole from it', () => {
    const rate = growthPerCycle({ stages: [UPPER], thresholdMPaSqrtMm: 63 });
    expect(rate(62.999)).toBe(0);
    expect(rate(63)).toBeCloseTo(1.29e-12 * 63 ** 2.88, 15);
  });

  it('is nothing for no range, a negative one or none at all', () => {
    const rate = growthPerCycle({ stages: [UPPER], thresholdMPaSqrtMm: 0 });
    expect([0, -5, Number.NaN].map(rate)).toEqual([0, 0, 0]);
  });

  it('never falls with the range', () => {
    const rate = growthPerCycle({ stages: [LOWER, UPPER], thresholdMPaSqrtMm: 63 });
    fc.assert(
      fc.property(between(1, 3000), between(0, 500), (range, more) => {
        expect(rate(range + more)).toBeGreaterThanOrEqual(rate(range));
      }),
    );
  });
});

describe('ratesPerYear', () => {
  const law = { stages: [{ coefficient: 1e-10, exponent: 2 }], thresholdMPaSqrtMm: 50 };
  const block = (membraneRangeMPa: number, cyclesPerYear: number) => ({
    membraneRangeMPa,
    bendingRangeMPa: 0,
    cyclesPerYear,
  });
  const rates = (drivers: Drivers) => {
    const into = { a: 0, c: 0 };
    ratesPerYear(drivers, { deepest: (m) => m, end: (m) => m / 2 })(into);
    return into;
  };

  it('holds each block against the threshold by its own range', () => {
    const { a, c } = rates({
      fatigue: { law, blocks: [block(100, 1000), block(40, 1e6)] },
      stressCorrosion: null,
    });
    expect(a).toBeCloseTo(1000 * 1e-10 * 100 ** 2, 15);
    // half the K at the end: the large block is just at the threshold there, the small one under it
    expect(c).toBeCloseTo(1000 * 1e-10 * 50 ** 2, 15);
  });

  it('adds stress corrosion to fatigue', () => {
    const stressCorrosion = { depthRateMmPerYear: 0.3, endRateMmPerYear: 0.7 };
    const { a, c } = rates({ fatigue: { law, blocks: [block(100, 1000)] }, stressCorrosion });
    expect(a).toBeCloseTo(0.3 + 1e-3, 12);
    expect(c).toBeCloseTo(0.7 + 2.5e-4, 12);
  });

  it('is nothing without a cause', () => {
    expect(rates({ fatigue: null, stressCorrosion: null })).toEqual({ a: 0, c: 0 });
  });
});

describe('integrateGrowth', () => {
  const until = (key: string, size: number): GrowthLimit => ({ key, margin: (a) => size - a });
  const paris = (m: number) => (a: number, _c: number, into: { a: number; c: number }) => {
    into.a = 1e-3 * a ** (m / 2);
    into.c = 0;
  };
  const exact = (m: number, from: number, to: number) =>
    m === 2
      ? Math.log(to / from) / 1e-3
      : (to ** (1 - m / 2) - from ** (1 - m / 2)) / ((1 - m / 2) * 1e-3);

  it('agrees with the closed form of the Paris law to 1 in 10⁵, with few evaluations', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(2, 2.88, 3, 4, 5.1),
        between(0.5, 4),
        between(1.5, 12),
        (m, from, times) => {
          const to = from * times;
          const run = integrateGrowth({ a: from, c: 10 }, paris(m), [until('end', to)], {
            horizonYears: 1e9,
          });
          const years = run.states[run.states.length - 1]?.years ?? 0;
          expect(run).toMatchObject({ stop: 'limit', limit: 'end' });
          expect(years / exact(m, from, to)).toBeCloseTo(1, 5);
          expect(run.evaluations).toBeLessThan(600);
        },
      ),
    );
  });

  it('stands exactly on the limit at the end', () => {
    const run = integrateGrowth({ a: 1, c: 10 }, paris(3), [until('end', 7.3)], {
      horizonYears: 1e9,
    });
    expect(run.states[run.states.length - 1]?.a).toBeCloseTo(7.3, 9);
  });

  it('stops at the earliest of several limits inside one step', () => {
    const limits = [until('later', 1.0502), until('sooner', 1.0501)];
    const run = integrateGrowth({ a: 1, c: 10 }, paris(3), limits, {
      horizonYears: 1e9,
      maxStep: 0.5,
    });
    expect(run.limit).toBe('sooner');
  });

  it('stops exactly at the horizon', () => {
    const run = integrateGrowth({ a: 1, c: 10 }, paris(2), [until('end', 1e6)], {
      horizonYears: 500,
    });
    expect(run.stop).toBe('horizon');
    const last = run.states[run.states.length - 1];
    expect(last?.years).toBeCloseTo(500, 8);
    expect(last?.a).toBeCloseTo(Math.exp(0.5), 5);
  });

  it('follows a flaw whose ends grow while its depth stands still', () => {
    const rates = (_a: number, c: number, into: { a: number; c: number }) => {
      into.a = 0;
      into.c = 0.1 * c;
    };
    const run = integrateGrowth(
      { a: 2, c: 5 },
      rates,
      [{ key: 'long', margin: (_, c) => 20 - c }],
      { horizonYears: 1e9 },
    );
    const last = run.states[run.states.length - 1];
    expect(last?.years).toBeCloseTo(Math.log(4) / 0.1, 4);
    expect(last?.a).toBeCloseTo(2, 12);
  });

  it('finds a kink in the rate without a loss of accuracy', () => {
    // the rate is ten times higher from a = 2 on
    const rates = (a: number, _c: number, into: { a: number; c: number }) => {
      into.a = a < 2 ? 0.01 * a : 0.1 * a;
      into.c = 0;
    };
    const run = integrateGrowth({ a: 1, c: 5 }, rates, [until('end', 4)], { horizonYears: 1e9 });
    const years = run.states[run.states.length - 1]?.years ?? 0;
    const exactYears = Math.log(2) / 0.01 + Math.log(2) / 0.1;
    expect(Math.abs(years / exactYears - 1)).toBeLessThan(1e-3);
  });

  it('comes to rest when growth ceases on the way', () => {
    const rates = (a: number, _c: number, into: { a: number; c: number }) => {
      into.a = a < 2 ? 0.1 : 0;
      into.c = 0;
    };
    const run = integrateGrowth({ a: 1, c: 5 }, rates, [until('end', 4)], { horizonYears: 100 });
    expect(run.stop).toBe('no growth');
    expect(run.states[run.states.length - 1]).toMatchObject({ years: 100 });
    expect(run.states[run.states.length - 1]?.a).toBeCloseTo(2, 3);
  });
});

describe('the rule for embedded flaws near a face', () => {
  it('turns at a ligament of 0.4 of the half height', () => {
    expect(becomesSurface(5, 2.001)).toBe(false);
    expect(becomesSurface(5, 2)).toBe(true);
    expect(proximityMargin(5, 3)).toBeCloseTo(1, 12);
    expect(surfaceDepth(5, 2)).toBe(12);
  });
});
