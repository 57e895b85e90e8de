import fc from 'fast-check';
import { exp, expEach, log, logEach, LOG_GREATEST, LOG_LEAST, logOfAny } from './exp-log';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the own exponential', () => {
  it('agrees with the library to a few units of the last place', () => {
    fc.assert(
      fc.property(between(-690, 690), (x) => {
        expect(Math.abs(exp(x) / Math.exp(x) - 1)).toBeLessThan(1.5e-15);
      }),
      { numRuns: 2000 },
    );
  });

  it('is exact at 0 and at whole powers of two within rounding', () => {
    expect(exp(0)).toBe(1);
    for (const k of [-1000, -1, 1, 10, 1000]) {
      expect(Math.abs(exp(k * Math.LN2) / 2 ** k - 1)).toBeLessThan(2e-13);
    }
  });

  it('stays a number however large its argument', () => {
    expect(exp(1e6)).toBe(exp(700));
    expect(exp(-1e6)).toBe(exp(-700));
    expect(exp(-1e6)).toBeGreaterThan(0);
    expect(Number.isFinite(exp(Infinity))).toBe(true);
  });

  it('turns sums into products', () => {
    fc.assert(
      fc.property(between(-100, 100), between(-100, 100), (x, y) => {
        expect(Math.abs(exp(x + y) / (exp(x) * exp(y)) - 1)).toBeLessThan(1e-13);
      }),
    );
  });

  it('gives the bits it always gave', () => {
    // a change here changes recorded lives
    expect(exp(1)).toBe(2.7182818284590446);
    expect(exp(-2.5)).toBeCloseTo(0.0820849986238988, 16);
  });
});

describe('the own logarithm', () => {
  it('agrees with the library to a few units of the last place', () => {
    fc.assert(
      fc.property(between(Math.log2(LOG_LEAST), Math.log2(LOG_GREATEST) - 1e-9), (octaves) => {
        const x = 2 ** octaves;
        const scale = Math.max(1, Math.abs(Math.log(x)));
        expect(Math.abs(log(x) - Math.log(x)) / scale).toBeLessThan(1e-15);
      }),
      { numRuns: 2000 },
    );
  });

  it('undoes the exponential', () => {
    fc.assert(
      fc.property(between(-4, 16), (x) => {
        expect(Math.abs(log(exp(x)) - x)).toBeLessThan(4e-15);
      }),
    );
  });

  it('reaches both bounds', () => {
    expect(log(LOG_LEAST)).toBeCloseTo(-6 * Math.LN2, 14);
    expect(log(LOG_GREATEST)).toBeCloseTo(24 * Math.LN2, 13);
  });

  it('takes any positive number by the long way', () => {
    for (const x of [2.1e-17, 1e-300, 1, 3.7e9, 1e200]) {
      expect(Math.abs(logOfAny(x) / (Math.log(x) || 1) - (x === 1 ? 0 : 1))).toBeLessThan(1e-14);
    }
  });
});

describe('lists', () => {
  it('are worked through in place, the rest untouched', () => {
    const values = Float64Array.of(1, 2, 3);
    expEach(values, 2);
    expect([...values]).toEqual([exp(1), exp(2), 3]);
    logEach(values, 2);
    expect(values[0]).toBeCloseTo(1, 14);
    expect(values[1]).toBeCloseTo(2, 14);
  });
});
