import fc from 'fast-check';
import { gapBetween, joined, joiningMargin } from './neighbours';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const flaw = fc.record({ a: between(0.5, 10), c: between(1, 40) });

describe('two flaws in one plane', () => {
  const one = { a: 3, c: 10 };
  const other = { a: 5, c: 6 };

  it('join at the gap the rule says', () => {
    const deeper = (x: { a: number }, y: { a: number }) => Math.max(x.a, y.a);
    expect(gapBetween(one, other, 30)).toBe(14);
    expect(joiningMargin(one, other, 30, deeper)).toBe(9);
    expect(joiningMargin(one, other, 21, deeper)).toBe(0);
  });

  it('become one from far end to far end, as deep as the deeper', () => {
    expect(joined(one, other, 21)).toEqual({ a: 5, c: 18.5 });
  });

  it('give the same flaw from either side, that holds both', () => {
    fc.assert(
      fc.property(flaw, flaw, between(0, 100), (x, y, distance) => {
        const both = joined(x, y, distance);
        const turned = joined(y, x, distance);
        expect(turned.c).toBeCloseTo(both.c, 9);
        expect(both.c).toBeGreaterThanOrEqual(Math.max(x.c, y.c) - 1e-9);
        expect(both.a).toBe(Math.max(x.a, y.a));
      }),
    );
  });

  it('swallow a smaller one that lies inside', () => {
    expect(joined({ a: 3, c: 20 }, { a: 1, c: 2 }, 5).c).toBe(20);
  });

  it('come closer as either grows', () => {
    fc.assert(
      fc.property(flaw, flaw, between(0, 5), (x, y, more) => {
        expect(gapBetween({ ...x, c: x.c + more }, y, 100)).toBeLessThanOrEqual(
          gapBetween(x, y, 100),
        );
      }),
    );
  });
});
