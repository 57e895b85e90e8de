import fc from 'fast-check';
import { integralTo, runningIntegral } from './running-integral';

describe('a running integral', () => {
  const sine = runningIntegral(Math.sin, 2, 100);

  it('is the integral anywhere between its ends', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 2, noNaN: true }), (x) => {
        expect(integralTo(sine, x)).toBeCloseTo(1 - Math.cos(x), 9);
      }),
    );
  });

  it('is exact at its steps and for parabolas', () => {
    expect(integralTo(sine, 2)).toBeCloseTo(1 - Math.cos(2), 14);
    const square = runningIntegral((x) => 3 * x * x, 1, 4);
    expect(integralTo(square, 0.37)).toBeCloseTo(0.37 ** 3, 14);
    expect(integralTo(square, 0)).toBe(0);
  });

  it('does not jump at a step', () => {
    const at = (x: number) => integralTo(sine, x);
    expect(at(1 + 1e-10)).toBeCloseTo(at(1 - 1e-10), 9);
  });
});
