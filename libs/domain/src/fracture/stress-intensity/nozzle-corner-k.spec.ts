import fc from 'fast-check';
import { crackOf, influenceOf } from '../../verification/crack-of';
import { degrees } from '../../units/quantity';
import { NOZZLE_CORNER_K, nozzleCornerK } from './nozzle-corner-k';
import { kOfTerms, termsOf } from './stress-terms';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the flaw at a nozzle corner', () => {
  it('gives the same by stress terms of the wall as by the polynomial in millimetres', () => {
    fc.assert(
      fc.property(
        between(1, 20),
        fc.tuple(between(200, 400), between(-3, 3), between(-0.1, 0.1), between(-0.01, 0.01)),
        (a, coefficients) => {
          const t = 50;
          const crack = { a, c: a, t };
          const higher = { quadratic: 0, cubic: 0, quartic: 0 };
          NOZZLE_CORNER_K.higher?.(crackOf(crack), degrees(0), higher);
          const terms = termsOf(coefficients.map((s, n) => s * t ** n));
          expect(kOfTerms(influenceOf(NOZZLE_CORNER_K, crack, 0), higher, terms)).toBeCloseTo(
            Math.max(nozzleCornerK(coefficients, a), 0),
            6,
          );
        },
      ),
    );
  });

  it('takes less from a stress that rises later', () => {
    const terms = [[1], [0, 1], [0, 0, 1], [0, 0, 0, 1]].map((s) => nozzleCornerK(s, 1));
    terms.reduce((before, now) => {
      expect(now).toBeLessThan(before);
      return now;
    });
    const higher = { quadratic: 0, cubic: 0, quartic: 0 };
    NOZZLE_CORNER_K.higher?.(crackOf({ a: 1, c: 1, t: 1 }), degrees(0), higher);
    expect(higher.quartic).toBeLessThan(higher.cubic);
    expect(higher.quartic).toBeGreaterThan(0.7 * higher.cubic);
  });

  it('counts an uneven flaw as the quarter circle around it', () => {
    const k = (a: number, c: number) => influenceOf(NOZZLE_CORNER_K, { a, c, t: 60 }, 90).membrane;
    expect(k(6, 9)).toBe(k(9, 9));
    expect(k(9, 6)).toBe(k(9, 9));
  });

  it('adds stresses', () => {
    expect(nozzleCornerK([100, -5, 0.1, 0.01], 5)).toBeCloseTo(
      nozzleCornerK([100], 5) +
        nozzleCornerK([0, -5], 5) +
        nozzleCornerK([0, 0, 0.1], 5) +
        nozzleCornerK([0, 0, 0, 0.01], 5),
      9,
    );
  });
});
