import { boardScale } from './board-scale';

describe('boardScale', () => {
  it('keeps every date inside and in order', () => {
    const scale = boardScale('2026-12-01', ['2026-11-12', '2027-07-23', '2031-03-10']);
    const places = ['2026-11-12', '2026-12-01', '2027-07-23', '2031-03-10'].map(scale.place);
    expect([...places].sort((a, b) => a - b)).toEqual(places);
    expect(places.every((place) => place > 0 && place < 100)).toBe(true);
  });

  it('marks the first of January of each year in between', () => {
    const { years, place } = boardScale('2026-12-01', ['2029-06-01']);
    expect(years.map(({ year }) => year)).toEqual([2027, 2028, 2029]);
    expect(years[0]?.place).toBe(place('2027-01-01'));
  });

  it('shows a year even when there is nothing but today', () => {
    const { place } = boardScale('2026-12-01', []);
    expect(place('2026-12-01')).toBeGreaterThan(0);
    expect(place('2040-01-01')).toBe(100);
  });
});
