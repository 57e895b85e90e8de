import fc from 'fast-check';
import { exponential } from '../distributions/weibull';
import { updateDetection } from './update-detection';
import { presentThoughNotFound } from './present-though-not-found';
import { updateMissedSize } from './update-missed';
import { updateNormal } from './update-normal';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a measurement added to what was believed', () => {
  it('never widens what is known, and lands between the two', () => {
    fc.assert(
      fc.property(
        between(-50, 50),
        between(0.01, 20),
        between(-50, 50),
        between(0.01, 20),
        (a, sa, b, sb) => {
          const now = updateNormal({ mean: a, sd: sa }, { mean: b, sd: sb });
          if (now.status === 'refused') throw new Error('refused');
          expect(now.sd).toBeLessThanOrEqual(Math.min(sa, sb));
          expect(now.mean).toBeGreaterThanOrEqual(Math.min(a, b) - 1e-9);
          expect(now.mean).toBeLessThanOrEqual(Math.max(a, b) + 1e-9);
          expect(1 / now.sd ** 2).toBeCloseTo(1 / sa ** 2 + 1 / sb ** 2, 4);
        },
      ),
    );
  });

  it('gives the same whichever of two measurements comes first', () => {
    const [prior, x, y] = [
      { mean: 4, sd: 1 },
      { mean: 5, sd: 0.5 },
      { mean: 3.8, sd: 0.7 },
    ];
    const both = (first: typeof x, second: typeof x) => {
      const now = updateNormal(prior, first);
      return now.status === 'updated' ? updateNormal(now, second) : now;
    };
    const [one, other] = [both(x, y), both(y, x)];
    expect(one.status === 'updated' && one.mean).toBeCloseTo(
      other.status === 'updated' ? other.mean : 0,
      12,
    );
  });

  it('says when the two hardly belong together', () => {
    const now = updateNormal({ mean: 2, sd: 0.3 }, { mean: 6, sd: 0.4 });
    expect(now.status === 'updated' && now.surprise).toBeCloseTo(8, 9);
    expect(now.status === 'updated' && now.caution).toMatch(/same flaw/);
  });

  it.each([
    ['prior.sd', { mean: 1, sd: 0 }, { mean: 1, sd: 1 }],
    ['measurement.mean', { mean: 1, sd: 1 }, { mean: Number.NaN, sd: 1 }],
    ['measurement.sd', { mean: 1, sd: 1 }, { mean: 1, sd: -1 }],
  ])('is refused by name: %s', (input, prior, measurement) => {
    const now = updateNormal(prior, measurement);
    expect(now.status === 'refused' && now.refusals[0]?.input).toBe(input);
  });
});

describe('a flaw that was not found', () => {
  it('has a smaller size, as a sum over the sizes shows', () => {
    const [m, scale] = [2, 3];
    const prior = exponential(m);
    let [missed, size] = [0, 0];
    const n = 20_000;
    for (let i = 0; i < n; i++) {
      const a = prior.quantile((i + 0.5) / n);
      missed += Math.exp(-a / scale) / n;
      size += (a * Math.exp(-a / scale)) / n;
    }
    const now = updateMissedSize(m, scale);
    if (now.status === 'refused') throw new Error('refused');
    expect(now.notFound).toBeCloseTo(missed, 4);
    expect(now.meanSizeMm).toBeCloseTo(size / missed, 3);
    expect(now.meanSizeMm).toBeLessThan(m);
  });

  it('may still be there', () => {
    expect(presentThoughNotFound(0.3, 0)).toBeCloseTo(0.3, 12);
    expect(presentThoughNotFound(0.3, 1)).toBe(0);
    fc.assert(
      fc.property(between(0, 0.999), between(0, 1), (prior, detection) => {
        expect(presentThoughNotFound(prior, detection)).toBeLessThanOrEqual(prior + 1e-12);
      }),
    );
  });

  it('is refused without a size', () => {
    expect(updateMissedSize(0, 3).status).toBe('refused');
    expect(updateMissedSize(2, Infinity).status).toBe('refused');
  });
});

describe('a probability of detection learnt from trials', () => {
  it('never becomes less certain than knowing nothing', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 60 }), fc.integer({ min: 0, max: 60 }), (hit, miss) => {
        const now = updateDetection({ alpha: 1, beta: 1 }, hit, hit + miss);
        if (now.status === 'refused') throw new Error('refused');
        expect(now.sd).toBeLessThanOrEqual(1 / Math.sqrt(12) + 1e-12);
        expect(now.lower95).toBeLessThan(now.mean);
      }),
    );
  });

  it('lets 28 of 28 with a flat prior show 90 % at 95 %', () => {
    const now = updateDetection({ alpha: 1, beta: 1 }, 28, 28);
    expect(now.status === 'updated' && now.lower95).toBeCloseTo(0.05 ** (1 / 29), 10);
  });

  it.each([
    ['found', { alpha: 1, beta: 1 }, 21, 20],
    ['found', { alpha: 1, beta: 1 }, 1.5, 20],
    ['trials', { alpha: 1, beta: 1 }, 1, Number.NaN],
    ['prior.alpha', { alpha: 0, beta: 1 }, 1, 2],
  ])('is refused by name: %s', (input, prior, found, trials) => {
    const now = updateDetection(prior, found, trials);
    expect(now.status === 'refused' && now.refusals[0]?.input).toBe(input);
  });
});
