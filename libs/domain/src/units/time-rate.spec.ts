import { fromMmPerYear, SECONDS_PER, toMmPerYear } from './time-rate';

describe('rates of growth with time', () => {
  it('convert to millimetres a year', () => {
    expect(toMmPerYear(1, 'mm', 'year')).toBe(1);
    expect(toMmPerYear(1e-10, 'm', 's')).toBeCloseTo(1e-7 * SECONDS_PER.year, 12);
    expect(toMmPerYear(1e-5, 'in', 'h')).toBeCloseTo(25.4e-5 * 8766, 12);
  });

  it('convert there and back', () => {
    expect(fromMmPerYear(toMmPerYear(0.37, 'in', 'day'), 'in', 'day')).toBeCloseTo(0.37, 12);
  });
});
