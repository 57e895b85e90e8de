import fc from 'fast-check';
import { findMaximum } from './find-maximum';

describe('the greatest value between two bounds', () => {
  it('is found at the top of a hill', () => {
    fc.assert(
      fc.property(fc.double({ min: -3, max: 5, noNaN: true }), (top) => {
        const { x, value } = findMaximum((at) => 2 - (at - top) ** 2, -4, 6);
        expect(x).toBeCloseTo(top, 6);
        expect(value).toBeCloseTo(2, 12);
      }),
    );
  });

  it('is an end where the function only rises or falls', () => {
    expect(findMaximum((x) => x, 1, 3)).toEqual({ x: 3, value: 3 });
    expect(findMaximum((x) => -x, 1, 3)).toEqual({ x: 1, value: -1 });
  });
});
