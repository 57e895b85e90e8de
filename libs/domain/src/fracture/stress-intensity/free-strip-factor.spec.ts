import { freeStripFactor } from './free-strip-factor';

// own finite elements; the last column is a table of an in-service inspection code, recalled
const ROWS = [
  [0.2, 1.36733, 1.3654],
  [0.4, 2.11141, 2.1068],
  [0.6, 4.03311, 4.042],
  [0.8, 11.9553, 11.991],
] as const;
const LONG_AXIAL = [
  ['inside, Ri/t 5', [1.31517, 1.8378, 2.73775, 3.95164]],
  ['inside, Ri/t 10', [1.34076, 1.96274, 3.23038, 5.56031]],
  ['inside, Ri/t 100', [1.36469, 2.09527, 3.93073, 10.5517]],
  ['outside, Ri/t 5', [1.33194, 1.8701, 2.86781, 4.41646]],
  ['outside, Ri/t 10', [1.34729, 1.97027, 3.27707, 5.84834]],
  ['outside, Ri/t 100', [1.36499, 2.09447, 3.9293, 10.6117]],
] as const;

describe('freeStripFactor', () => {
  it.each(ROWS)(
    'at α = %d is %d by finite elements and %d by the table',
    (depth, elements, table) => {
      expect(freeStripFactor(depth) / elements).toBeCloseTo(1, 2.7);
      expect(Math.abs(freeStripFactor(depth) / table - 1)).toBeLessThan(0.005);
    },
  );

  it('starts at the half plane', () => {
    expect(freeStripFactor(0)).toBeCloseTo(1.12152, 10);
  });

  it.each(LONG_AXIAL)('bounds the long axial crack %s', (_, factors) => {
    factors.forEach((factor, i) =>
      expect(freeStripFactor(0.2 * (i + 1))).toBeGreaterThanOrEqual(0.999 * factor),
    );
  });

  it('stays a number beyond its range', () => {
    expect(Number.isFinite(freeStripFactor(1.2))).toBe(true);
  });
});
