import { brokenCurveLimits, CURVE_LIMITS, type CurveInput, type TruePoint } from './curve-limits';

const INPUT: CurveInput = { points: [], values: 'true', yieldMPa: 400, youngsModulusMPa: 200_000 };
const elastic = (stress: number): TruePoint => ({ strain: stress / 200_000, stress });
const plastic = (stress: number, strain: number): TruePoint => ({ strain, stress });
const SOUND: readonly TruePoint[] = [
  elastic(100),
  elastic(200),
  elastic(280),
  elastic(320),
  plastic(380, 0.003),
  plastic(400, 0.004),
  plastic(420, 0.01),
  plastic(460, 0.04),
];
const namesOf = (points: readonly TruePoint[], input = INPUT) =>
  brokenCurveLimits(input, points).map(({ message }) => message.split(' is ')[0]);
const replaced = (index: number, point: TruePoint) =>
  SOUND.map((old, i) => (i === index ? point : old));

describe('the limits of a stress–strain curve', () => {
  it('are met by a sound one', () => {
    expect(namesOf(SOUND)).toEqual([]);
  });

  it('are data that can be shown: every one with words, bounds, a source and what to do', () => {
    for (const { name, text, min, max, source, instead } of CURVE_LIMITS) {
      expect(name.length).toBeGreaterThan(3);
      expect(text.length).toBeGreaterThan(10);
      expect(min).toBeLessThan(max);
      expect(source).toMatch(/common practice|from memory/);
      expect(instead).toMatch(/\.$/);
    }
  });

  it('hold at their edge and not beyond', () => {
    expect(namesOf(SOUND.slice(1))).toEqual(['Number of points']);
    expect(namesOf(replaced(0, plastic(100, 0.000525)))).toEqual([]);
    expect(namesOf(replaced(0, plastic(100, 0.000526)))).toEqual(['E ε/σ of the first point']);
    expect(namesOf(replaced(0, plastic(100, 0.000474)))).toEqual(['E ε/σ of the first point']);
    expect(namesOf(replaced(5, plastic(380, 0.004)))).toEqual([]);
    expect(namesOf(replaced(5, plastic(379, 0.004)))).toEqual(['Least step of true stress']);
    expect(namesOf(replaced(5, plastic(400, 0.003)))).toEqual(['Least step of strain']);
  });

  it('count the points about yield, both ends included', () => {
    const thin = replaced(3, elastic(275)).map((point, i) => (i === 2 ? elastic(270) : point));
    expect(namesOf(thin)).toEqual(['Points from 0.7 to 1.2 σY']);
    expect(namesOf(replaced(2, elastic(280)))).toEqual([]);
  });

  it('speak of the yield strength they are given', () => {
    expect(namesOf(SOUND, { ...INPUT, yieldMPa: 461 })).toContain(
      'Stress of the last point over σY',
    );
    expect(namesOf(SOUND, { ...INPUT, yieldMPa: 100 })).toContain(
      'Stress of the first point over σY',
    );
  });

  it('say every limit that is broken, input and value with it', () => {
    const [few] = brokenCurveLimits(INPUT, []);
    expect(few).toMatchObject({
      input: 'material.stressStrainCurve',
      limit: 'at least 8 points beside the origin',
      value: 0,
    });
    expect(brokenCurveLimits(INPUT, []).length).toBeGreaterThan(3);
  });
});
