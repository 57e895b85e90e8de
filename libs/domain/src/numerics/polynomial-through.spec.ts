import fc from 'fast-check';
import { polynomialThrough } from './polynomial-through';

const number = fc.double({ min: -10, max: 10, noNaN: true });

describe('the polynomial through points', () => {
  it('is the one the points come from', () => {
    fc.assert(
      fc.property(fc.array(number, { minLength: 1, maxLength: 5 }), (powers) => {
        const xs = powers.map((_, i) => (i + 0.5) / powers.length);
        const at = (x: number) => powers.reduceRight((sum, p) => sum * x + p, 0);
        const found = polynomialThrough(xs, xs.map(at));
        expect(found).toHaveLength(powers.length);
        for (const [i, power] of powers.entries()) expect(found[i]).toBeCloseTo(power, 8);
      }),
    );
  });

  it('goes through points in any order', () => {
    expect(polynomialThrough([2, 0, 1], [5, 1, 2])).toEqual([1, 0, 1]);
  });

  it('has no powers without points', () => {
    expect(polynomialThrough([], [])).toEqual([]);
  });
});
