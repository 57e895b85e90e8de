import fc from 'fast-check';
import { checkElasticUse, type ElasticUse, type ElasticUseInput } from './linear-elastic-use';

const input = (more: Partial<ElasticUseInput> = {}): ElasticUseInput => ({
  intensity: 500,
  yieldMPa: 400,
  crackMm: 10,
  ligamentMm: 30,
  thicknessMm: 40,
  ...more,
});
const checked = (more: Partial<ElasticUseInput> = {}): ElasticUse => {
  const answer = checkElasticUse(input(more));
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('whether K alone may judge a crack', () => {
  it('yes, in plane strain, when every size is enough', () => {
    const { verdict, checks, plasticRadiusMm } = checked();
    expect(verdict).toBe('plane strain');
    expect(checks.map(({ met }) => met)).toEqual([true, true, true, true, true]);
    expect(checks[0]?.needMm).toBeCloseTo(3.90625, 10);
    expect(plasticRadiusMm.planeStress / plasticRadiusMm.planeStrain).toBeCloseTo(3, 12);
  });

  it('yes, in plane stress, when only the wall is thin', () => {
    const { verdict, message } = checked({ thicknessMm: 3 });
    expect(verdict).toBe('plane stress');
    expect(message).toMatch(/wall of 3 mm is below 3.91 mm/);
  });

  it('no, in millimetres, for a tough and shallow crack', () => {
    const { verdict, message, checks } = checked({
      intensity: 42.8 * Math.sqrt(1000),
      yieldMPa: 286,
      crackMm: 8.6,
      ligamentMm: 19.4,
      thicknessMm: 28,
    });
    expect(verdict).toBe('not alone');
    expect(message).toMatch(
      /2.5 \(K\/σy\)² is 56 mm; the crack has 8.6 mm and the ligament 19.4 mm/,
    );
    expect(checks.every(({ met }) => !met)).toBe(true);
  });

  it('no, when the ligament alone is too small', () => {
    const { verdict, checks } = checked({ ligamentMm: 0 });
    expect(verdict).toBe('not alone');
    expect(checks.filter(({ met }) => !met).map(({ name }) => name)).toEqual([
      'ligament',
      'zone in the ligament',
    ]);
  });

  it('asks for the tenth of the size with the zone of plane stress in a thin wall', () => {
    const thin = checked({ thicknessMm: 3 }).checks[3]?.needMm ?? 0;
    const thick = checked().checks[3]?.needMm ?? 0;
    expect(thin / thick).toBeCloseTo(3, 12);
    expect(thick).toBeCloseTo((10 / (3 * Math.PI)) * 1.25 ** 2, 10);
  });

  it('never turns to yes with more load', () => {
    fc.assert(
      fc.property(between(1, 5000), between(1, 5000), (k, more) => {
        const order = ['plane strain', 'plane stress', 'not alone'];
        const [one, other] = [k, k + more].map((intensity) =>
          order.indexOf(checked({ intensity }).verdict),
        );
        expect(other).toBeGreaterThanOrEqual(one ?? 0);
      }),
    );
  });

  it.each([
    [{ intensity: -1 }, 'intensity'],
    [{ intensity: Number.NaN }, 'intensity'],
    [{ yieldMPa: 0 }, 'material.yieldMPa'],
    [{ crackMm: 0 }, 'crack.sizeMm'],
    [{ ligamentMm: -0.1 }, 'crack.ligamentMm'],
    [{ thicknessMm: Infinity }, 'wall.thicknessMm'],
  ])('refuses %j by %s', (more, path) => {
    const answer = checkElasticUse(input(more));
    expect(answer.status === 'refused' && answer.refusals.map((each) => each.input)).toEqual([
      path,
    ]);
  });
});
