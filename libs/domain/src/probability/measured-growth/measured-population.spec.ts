import fc from 'fast-check';
import { normal } from '../distributions/normal';
import { randomGenerator } from '../sampling/random-generator';
import { growthOfNewFlaw } from './growth-of-new-flaw';
import { techniqueDifference } from './technique-difference';

const found = { years: 2024, sizeMm: 4, sizingSdMm: 0.5 };

describe('the growth of a flaw not reported before', () => {
  it('is bounded by the reporting threshold and by the size itself', () => {
    const growth = growthOfNewFlaw(found, { years: 2020, reportedFromMm: 3 });
    expect(growth).toMatchObject({ leastRateMmPerYear: 0.25, mostRateMmPerYear: 1 });
    expect(growth.status === 'bounded' && growth.words).toMatch(/0\.25 to 1\.00 mm\/year/);
  });

  it('may be none when the flaw is still below what was reported', () => {
    const growth = growthOfNewFlaw(found, { years: 2020, reportedFromMm: 5 });
    expect(growth).toMatchObject({ leastRateMmPerYear: 0, mostRateMmPerYear: 1 });
  });

  it.each([
    ['earlier.years', found, { years: 2024, reportedFromMm: 3 }],
    ['earlier.reportedFromMm', found, { years: 2020, reportedFromMm: -1 }],
    ['findings.0.sizeMm', { ...found, sizeMm: Number.NaN }, { years: 2020, reportedFromMm: 3 }],
  ])('is refused by name: %s', (input, finding, earlier) => {
    const growth = growthOfNewFlaw(finding, earlier);
    expect(growth.status === 'refused' && growth.refusals[0]?.input).toBe(input);
  });
});

describe('the difference between two inspections', () => {
  const { uniform } = randomGenerator(5);
  const changes = (shift: number, count: number) =>
    Array.from({ length: count }, () => ({
      changeMm: normal(shift, 0.7).quantile(uniform()),
      sdMm: 0.7,
    }));

  it('is found where there is one', () => {
    const answer = techniqueDifference(changes(0.5, 60));
    expect(answer).toMatchObject({ status: 'compared', systematic: true });
    expect(answer.status === 'compared' && Math.abs(answer.meanMm - 0.5)).toBeLessThan(4 * 0.0904);
    expect(answer.status === 'compared' && answer.meanSdMm).toBeCloseTo(0.7 / Math.sqrt(60), 9);
  });

  it('is claimed without cause as often as its level says', () => {
    const n = 1500;
    let alarms = 0;
    for (let i = 0; i < n; i++) {
      const answer = techniqueDifference(changes(0, 5));
      if (answer.status === 'compared' && answer.systematic) alarms += 1;
    }
    expect(Math.abs(alarms / n - 0.05)).toBeLessThan(4 * Math.sqrt((0.05 * 0.95) / n));
  });

  it('weighs the better sizings more', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 5, noNaN: true }), (change) => {
        const answer = techniqueDifference([
          { changeMm: change, sdMm: 1 },
          { changeMm: change, sdMm: 2 },
          { changeMm: 0, sdMm: 1000 },
        ]);
        expect(answer.status === 'compared' && answer.meanMm).toBeCloseTo(change, 4);
      }),
    );
  });

  it('is refused for too few flaws or impossible errors', () => {
    expect(techniqueDifference([{ changeMm: 0, sdMm: 1 }]).status).toBe('refused');
    const bad = [0, 1, 2].map((changeMm) => ({ changeMm, sdMm: 0 }));
    expect(techniqueDifference(bad).status).toBe('refused');
  });
});
