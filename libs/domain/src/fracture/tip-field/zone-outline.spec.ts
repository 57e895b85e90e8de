import { zoneOutline, type ZoneInput, type ZoneOutline } from './zone-outline';

const input = (more: Partial<ZoneInput> = {}): ZoneInput => ({
  intensity: 1000,
  yieldMPa: 400,
  condition: 'plane strain',
  poisson: 0.3,
  points: 181,
  ...more,
});
const found = (more: Partial<ZoneInput> = {}): ZoneOutline => {
  const answer = zoneOutline(input(more));
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};

describe('the outline of the plastic zone', () => {
  it('is closed at the tip and symmetric about the crack', () => {
    const { points } = found();
    expect(points).toHaveLength(181);
    expect(points[0]?.xMm).toBeCloseTo(0, 12);
    points.forEach(({ xMm, yMm }, i) => {
      const other = points[points.length - 1 - i];
      expect(other?.xMm).toBeCloseTo(xMm, 9);
      expect(other?.yMm).toBeCloseTo(-yMm, 9);
    });
  });

  it('lies beside the tip in plane strain and is far larger in plane stress', () => {
    const ahead = ({ points }: ZoneOutline) => points[90]?.xMm ?? 0;
    const [strain, stress] = [found(), found({ condition: 'plane stress' })];
    expect(ahead(stress)).toBeCloseTo(1000 ** 2 / 400 ** 2 / (2 * Math.PI), 9);
    expect(ahead(strain) / ahead(stress)).toBeCloseTo(0.16, 9);
    expect(strain.reachMm).toBeGreaterThan(5 * ahead(strain));
    expect(strain.reachMm).toBeLessThan(stress.reachMm);
  });

  it('grows with the square of K over yield', () => {
    expect(found({ intensity: 2000 }).reachMm / found().reachMm).toBeCloseTo(4, 10);
    expect(found({ yieldMPa: 800 }).reachMm / found().reachMm).toBeCloseTo(0.25, 10);
    expect(found({ intensity: 0 }).reachMm).toBe(0);
  });

  it.each([
    [{ intensity: -1 }, 'intensity'],
    [{ intensity: Number.NaN }, 'intensity'],
    [{ yieldMPa: 0 }, 'yieldMPa'],
    [{ poisson: 0.6 }, 'poisson'],
    [{ points: 3 }, 'points'],
    [{ points: Infinity }, 'points'],
  ])('is refused for %j', (more, path) => {
    const answer = zoneOutline(input(more));
    expect(answer.status === 'refused' && answer.refusals.map((each) => each.input)).toEqual([
      path,
    ]);
  });
});
