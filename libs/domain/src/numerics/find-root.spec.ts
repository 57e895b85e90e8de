import fc from 'fast-check';
import { findRoot } from './find-root';

describe('findRoot', () => {
  it('finds a root inside the bracket and says so', () => {
    const root = findRoot((x) => x * x - 2, 0, 2);
    expect(root.status).toBe('found');
    expect(root.x).toBeCloseTo(Math.SQRT2, 12);
    expect(root.evaluations).toBeLessThan(15);
  });

  it('takes an end of the bracket that is a root', () => {
    expect(findRoot((x) => x, 0, 5)).toMatchObject({ status: 'found', x: 0 });
    expect(findRoot((x) => x - 5, 0, 5)).toMatchObject({ status: 'found', x: 5 });
  });

  it('has no answer without a change of sign', () => {
    expect(findRoot((x) => x * x + 1, -1, 1)).toMatchObject({
      status: 'no sign change',
      x: Number.NaN,
    });
  });

  it('says when the function is no number', () => {
    expect(findRoot(() => Number.NaN, 0, 1).status).toBe('not a number');
    expect(findRoot((x) => (x === 0 || x === 1 ? x - 0.5 : Number.NaN), 0, 1).status).toBe(
      'not a number',
    );
  });

  it('ends at the jump of a function that jumps across zero', () => {
    const root = findRoot((x) => (x < 0.3 ? 1 : -1), 0, 1, { tolerance: 1e-10 });
    expect(root.status).toBe('found');
    expect(root.x).toBeCloseTo(0.3, 9);
  });

  it('bears a function that falls to minus infinity', () => {
    const root = findRoot((x) => (x < 0.7 ? 0.7 - x : -Infinity), 0, 1, { tolerance: 1e-10 });
    expect(root.x).toBeCloseTo(0.7, 8);
  });

  it('stops at the limit of evaluations', () => {
    expect(findRoot((x) => x ** 9 - 1e-9, 0, 1, { maxEvaluations: 4 }).status).toBe(
      'iteration limit',
    );
  });

  it('never leaves the bracket and meets its tolerance for any rising function', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 0.95, noNaN: true }),
        fc.double({ min: 0.2, max: 9, noNaN: true }),
        (at, power) => {
          const seen: number[] = [];
          const root = findRoot(
            (x) => {
              seen.push(x);
              return x ** power - at ** power;
            },
            0,
            1,
            { tolerance: 1e-11 },
          );
          expect(root.status).toBe('found');
          expect(Math.abs(root.x - at)).toBeLessThan(1e-8);
          expect(seen.every((x) => x >= 0 && x <= 1)).toBe(true);
        },
      ),
    );
  });
});
