import { firstCrossing } from './first-crossing';

describe('firstCrossing', () => {
  it('takes the first of several crossings', () => {
    const crossing = firstCrossing((x) => Math.cos(x), 0, 10, { tolerance: 1e-12 });
    expect(crossing.status).toBe('found');
    expect(crossing.x).toBeCloseTo(Math.PI / 2, 10);
  });

  it('says when the function is already below', () => {
    expect(firstCrossing((x) => x - 1, 0, 2)).toEqual({ status: 'below from the start', x: 0 });
  });

  it('says when there is none, with the end of the range', () => {
    expect(firstCrossing(() => 1, 0, 2)).toEqual({ status: 'none', x: 2 });
  });

  it('says when the function is no number, at the start or on the way', () => {
    expect(firstCrossing(() => Number.NaN, 0, 1).status).toBe('not a number');
    expect(firstCrossing((x) => (x > 0.5 ? Number.NaN : 1), 0, 1).status).toBe('not a number');
  });

  it('finds the jump of a function that jumps', () => {
    expect(firstCrossing((x) => (x < 0.61 ? 2 : -2), 0, 1, { tolerance: 1e-10 }).x).toBeCloseTo(
      0.61,
      8,
    );
  });

  it('takes a touch of zero at the edge of an interval as a crossing', () => {
    expect(firstCrossing((x) => 1 - x, 0, 1)).toMatchObject({ status: 'found', x: 1 });
  });
});
