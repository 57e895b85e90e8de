import { crackOf } from '../verification/crack-of';
import { checkLimit, insideLimits, roomToUpperBounds, type Limit } from './limit';

const limit = (min: number, max: number): Limit => ({
  name: 'a/t',
  text: 'between',
  min,
  max,
  measure: ({ a, thickness }) => a / thickness,
  source: 'test',
  input: 'flaw.heightMm',
  instead: 'repair',
});
const at = (depth: number) => crackOf({ a: depth * 10, c: 20, t: 10 });

describe('limits as data', () => {
  it('are met inside and broken outside', () => {
    expect(checkLimit(limit(0, 0.8), at(0.5))).toMatchObject({
      met: true,
      near: false,
      value: 0.5,
    });
    expect(checkLimit(limit(0, 0.8), at(0.81)).met).toBe(false);
    expect(checkLimit(limit(0.1, 0.8), at(0.05)).met).toBe(false);
  });

  it('are near within a tenth of a bound, above or below', () => {
    expect(checkLimit(limit(0, 0.8), at(0.75)).near).toBe(true);
    expect(checkLimit(limit(0.1, 0.8), at(0.105)).near).toBe(true);
    expect(checkLimit(limit(0, 0.8), at(0.9)).near).toBe(false);
  });

  it('are met at the bound itself, rounding included', () => {
    expect(checkLimit(limit(0, 0.8), at(0.8 * (1 + 1e-12))).met).toBe(true);
  });

  it('are met by no value that is not a number', () => {
    expect(checkLimit(limit(0, 1), at(Number.NaN)).met).toBe(false);
    expect(insideLimits([limit(0, 1)], at(Number.NaN))).toBe(false);
  });

  it('tell which upper bound is nearest', () => {
    const [loose, tight] = [limit(0, 2), limit(0, 0.8)];
    expect(roomToUpperBounds([loose, tight], at(0.4))).toEqual({ room: 0.5, limit: tight });
    expect(roomToUpperBounds([loose, tight], at(0.9)).room).toBeLessThan(0);
    expect(roomToUpperBounds([limit(0, Infinity)], at(0.5))).toEqual({
      room: Infinity,
      limit: null,
    });
  });
});
