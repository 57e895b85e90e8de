import fc from 'fast-check';
import { complex, multiply, reciprocal, squareRoot } from './complex';

const part = fc.double({ min: -1e6, max: 1e6, noNaN: true });

describe('complex numbers', () => {
  it('multiply, also into themselves', () => {
    const a = complex(1, 2);
    expect(multiply(a, complex(3, 4), a)).toEqual({ re: -5, im: 10 });
  });

  it('have a reciprocal', () => {
    expect(reciprocal(complex(3, 4), complex())).toEqual({ re: 0.12, im: -0.16 });
    const i = complex(0, 1);
    expect(reciprocal(i, i)).toEqual({ re: 0, im: -1 });
  });

  it.each([
    [4, 0, 2, 0],
    [-4, 0, 0, 2],
    [0, 2, 1, 1],
    [0, -2, 1, -1],
    [0, 0, 0, 0],
    [-3, -4, 1, -2],
  ])('root of %d + %di', (re, im, rootRe, rootIm) => {
    const root = squareRoot(complex(re, im), complex());
    expect(root.re).toBeCloseTo(rootRe, 14);
    expect(root.im).toBeCloseTo(rootIm, 14);
  });

  it('give back the number when a root is squared', () => {
    fc.assert(
      fc.property(part, part, (re, im) => {
        // a square that underflows has lost its digits before the root is taken
        fc.pre(Math.hypot(re, im) > 1e-100);
        const root = squareRoot(complex(re, im), complex());
        expect(root.re).toBeGreaterThanOrEqual(0);
        multiply(root, root, root);
        const size = Math.hypot(re, im);
        expect(Math.abs(root.re - re) / size).toBeLessThan(1e-14);
        expect(Math.abs(root.im - im) / size).toBeLessThan(1e-14);
      }),
    );
  });
});
