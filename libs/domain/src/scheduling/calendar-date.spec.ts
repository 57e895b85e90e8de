import {
  daysAfter,
  daysBetween,
  earliest,
  monthsAfter,
  parseDate,
  yearsAfter,
} from './calendar-date';

describe('calendar dates', () => {
  it('adds whole months and never runs past the end of a month', () => {
    expect(monthsAfter('2026-11-10', 24)).toBe('2028-11-10');
    expect(monthsAfter('2027-01-31', 1)).toBe('2027-02-28');
    expect(monthsAfter('2027-01-31', 1.9)).toBe('2027-02-28');
  });

  it('lets no leap day move a date later', () => {
    expect(monthsAfter('2028-02-29', 12)).toBe('2029-02-28');
  });

  it('rounds a part of a year down to whole days', () => {
    expect(yearsAfter('2026-11-10', 0.7)).toBe('2027-07-23');
    expect(yearsAfter('2026-11-10', 0)).toBe('2026-11-10');
  });

  it('counts calendar days across the change of the clocks', () => {
    expect(daysBetween('2027-03-27', '2027-03-29')).toBe(2);
    expect(daysBetween('2027-10-30', '2027-11-01')).toBe(2);
    expect(daysBetween('2027-01-02', '2027-01-01')).toBe(-1);
    expect(daysAfter('2027-03-27', 2)).toBe('2027-03-29');
  });

  it('finds the earliest of several', () => {
    expect(earliest(['2028-01-01', '2027-12-31', '2030-01-01'])).toBe('2027-12-31');
    expect(earliest([])).toBeUndefined();
  });

  it.each(['2027-13-01', '2027-02-30', '10.11.2026', '2026-1-1', ''])('refuses %p', (text) => {
    expect(() => parseDate(text)).toThrow(/must look like 2027-07-23/);
  });
});
