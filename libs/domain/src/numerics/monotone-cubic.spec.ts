import fc from 'fast-check';
import { monotoneCubic } from './monotone-cubic';

const rising = fc
  .array(
    fc.tuple(
      fc.double({ min: 0.01, max: 10, noNaN: true }),
      fc.double({ min: 0, max: 10, noNaN: true }),
    ),
    { minLength: 2, maxLength: 12 },
  )
  .map((steps) => {
    let [x, y] = [0, 0];
    const points = steps.map(([dx, dy]) => [(x += dx), (y += dy)] as const);
    return { xs: points.map(([px]) => px), ys: points.map(([, py]) => py) };
  });
const share = fc.double({ min: 0, max: 1, noNaN: true });

describe('a monotone curve through points', () => {
  it('goes through every point', () => {
    fc.assert(
      fc.property(rising, ({ xs, ys }) => {
        const curve = monotoneCubic(xs, ys);
        xs.forEach((x, i) => expect(curve.at(x)).toBeCloseTo(ys[i] ?? Number.NaN, 9));
      }),
    );
  });

  it('never falls where the points rise', () => {
    fc.assert(
      fc.property(rising, share, share, ({ xs, ys }, one, other) => {
        const curve = monotoneCubic(xs, ys);
        const x = (s: number) => curve.from + s * (curve.to - curve.from);
        const [low, high] = [Math.min(one, other), Math.max(one, other)];
        expect(curve.at(x(high))).toBeGreaterThanOrEqual(curve.at(x(low)) - 1e-9);
      }),
    );
  });

  it('is straight where the points are', () => {
    const curve = monotoneCubic([0, 1, 3, 4], [1, 3, 7, 9]);
    for (const x of [0.2, 1.7, 2.9, 3.5]) expect(curve.at(x)).toBeCloseTo(1 + 2 * x, 12);
  });

  it('holds its ends beyond its range', () => {
    const curve = monotoneCubic([0, 1], [2, 5]);
    expect(curve.at(-3)).toBe(2);
    expect(curve.at(9)).toBe(5);
    expect(curve.at(0.5)).toBeCloseTo(3.5, 12);
  });

  it('turns only at a point', () => {
    const curve = monotoneCubic([0, 1, 2], [0, 1, 0]);
    expect(curve.at(1)).toBe(1);
    expect(curve.at(0.9)).toBeLessThan(1);
    expect(curve.at(1.1)).toBeLessThan(1);
  });
});
