import fc from 'fast-check';
import { normal } from '../distributions/normal';
import { randomGenerator } from '../sampling/random-generator';
import { compareWithPrediction } from './compare-with-prediction';
import { growthBetween, type ComparisonOptions } from './growth-between';
import { growthOverFindings } from './growth-over-findings';
import type { SizedFinding } from './sized-finding';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const finding = (years: number, sizeMm: number, sizingSdMm = 0.5): SizedFinding => ({
  years,
  sizeMm,
  sizingSdMm,
});

function measured(earlier: SizedFinding, later: SizedFinding, options?: ComparisonOptions) {
  const growth = growthBetween(earlier, later, options);
  if (growth.status === 'refused') throw new Error(growth.refusals[0]?.message);
  return growth;
}

function line(findings: readonly SizedFinding[]) {
  const growth = growthOverFindings(findings);
  if (growth.status === 'refused') throw new Error(growth.refusals[0]?.message);
  return growth;
}

describe('growth between two findings', () => {
  it('has a rate with the error of both sizings', () => {
    const growth = measured(finding(2020, 4), finding(2023, 5.2));
    expect(growth.rateMmPerYear).toBeCloseTo(0.4, 12);
    expect(growth.rateSdMmPerYear).toBeCloseTo(Math.SQRT1_2 / 3, 12);
    expect(growth.chanceWithoutGrowth).toBeCloseTo(0.04485, 4);
    expect(growth.finding).toBe('growth shown');
    expect(growth.upperRateMmPerYear).toBeCloseTo(0.4 + 1.6448536 * 0.2357023, 6);
  });

  it('is not called real when sizing error explains it', () => {
    const growth = measured(finding(0, 4), finding(3, 4.5));
    expect(growth.finding).toBe('no measurable growth');
    expect(growth.words).toMatch(/explained by sizing error/);
    expect(growth.upperRateMmPerYear).toBeGreaterThan(growth.rateMmPerYear);
  });

  it('is never used as a negative rate; shrinkage is named as sizing error', () => {
    const growth = measured(finding(0, 4.5), finding(3, 4.2));
    expect(growth.usedRateMmPerYear).toBe(0);
    expect(growth.words).toMatch(/^No measurable growth: the change is explained by sizing error/);
    expect(growth.words).not.toMatch(/-\d\S* mm\/year/);
    expect(growth.upperRateMmPerYear).toBeCloseTo(1.6448536 * 0.2357023, 6);
  });

  it('asks for another explanation when the flaw shrank beyond sizing error', () => {
    const growth = measured(finding(0, 8), finding(3, 4));
    expect(growth.finding).toBe('smaller beyond sizing error');
    expect(growth.words).toMatch(/same flaw/);
    expect(growth.usedRateMmPerYear).toBe(0);
    expect(growth.upperRateMmPerYear).toBeGreaterThan(0);
  });

  it('says which change would just be real: √2 · 1.645 of the sizing error', () => {
    expect(measured(finding(0, 4, 1), finding(3, 5, 1)).resolvableMm).toBeCloseTo(2.3262, 4);
    expect(
      measured(finding(0, 4, 1), finding(3, 5, 1), { techniqueSdMm: 1 }).resolvableMm,
    ).toBeCloseTo(1.6448536 * Math.sqrt(3), 5);
  });

  it('calls a change real exactly when it is beyond what can be resolved', () => {
    fc.assert(
      fc.property(
        between(2, 9),
        between(0.2, 2),
        between(0.2, 2),
        between(-1, 8),
        (a, s1, s2, d) => {
          fc.pre(a + d > 0.01);
          const growth = measured(finding(0, a, s1), finding(4, a + d, s2));
          fc.pre(Math.abs(growth.changeMm - growth.resolvableMm) > 1e-9);
          expect(growth.finding === 'growth shown').toBe(growth.changeMm > growth.resolvableMm);
        },
      ),
    );
  });

  it('raises a false alarm as often as its level says', () => {
    const { uniform } = randomGenerator(21);
    const size = normal(6, 0.5);
    let alarms = 0;
    const n = 4000;
    for (let i = 0; i < n; i++) {
      const [first, second] = [size.quantile(uniform()), size.quantile(uniform())];
      if (measured(finding(0, first), finding(1, second)).finding === 'growth shown') alarms += 1;
    }
    expect(Math.abs(alarms / n - 0.05)).toBeLessThan(4 * Math.sqrt((0.05 * 0.95) / n));
  });

  it.each([
    ['findings.1.years', finding(3, 4), finding(3, 5), {}],
    ['findings.1.years', finding(3, 4), finding(1, 5), {}],
    ['findings.0.sizeMm', finding(0, 0), finding(1, 5), {}],
    ['findings.1.sizingSdMm', finding(0, 4), finding(1, 5, 0), {}],
    ['findings.1.sizeMm', finding(0, 4), finding(1, Number.NaN), {}],
    ['level', finding(0, 4), finding(1, 5), { level: 5 }],
    ['techniqueSdMm', finding(0, 4), finding(1, 5), { techniqueSdMm: -1 }],
  ])('is refused by name: %s', (input, earlier, later, options) => {
    const growth = growthBetween(earlier, later, options);
    expect(growth.status === 'refused' && growth.refusals[0]?.input).toBe(input);
  });
});

describe('growth over three and more findings', () => {
  it('has an error that equal sizings at 0, 2 and 4 years put at 0.25 mm/year for 0.7 mm', () => {
    const growth = line([finding(0, 5, 0.7), finding(2, 5, 0.7), finding(4, 5, 0.7)]);
    expect(growth.rateSdMmPerYear).toBeCloseTo(0.2475, 4);
    expect(growth.upperRateMmPerYear).toBeCloseTo(0.4071, 4);
    expect(growth.chanceOfConstantSize).toBeCloseTo(1, 9);
    expect(growth.finding).toBe('no measurable growth');
  });

  it('is the line itself when the findings lie on one', () => {
    fc.assert(
      fc.property(between(1, 9), between(0, 2), between(0.1, 2), (size, rate, sd) => {
        const growth = line([0, 1, 3, 4].map((t, i) => finding(t, size + rate * t, sd + i / 10)));
        expect(growth.rateMmPerYear).toBeCloseTo(rate, 9);
        expect(growth.sizeNowMm).toBeCloseTo(size + 4 * rate, 8);
        expect(growth.chanceOfStraightLine).toBeGreaterThan(0.99);
        expect(growth.caution).toBeNull();
      }),
    );
  });

  it('follows the better sizings more closely', () => {
    const sloppy = line([finding(0, 4, 0.2), finding(2, 8, 5), finding(4, 5, 0.2)]);
    expect(sloppy.rateMmPerYear).toBeCloseTo(0.25, 2);
    expect(sloppy.sizeNowSdMm).toBeLessThan(0.21);
  });

  it('says when a straight line does not explain the findings', () => {
    const bent = line([finding(0, 4, 0.2), finding(2, 4, 0.2), finding(4, 7, 0.2)]);
    expect(bent.caution).toMatch(/not steady/);
    expect(bent.chanceOfConstantSize).toBeLessThan(1e-6);
  });

  it('is refused for two findings, out of order, or at an impossible level', () => {
    expect(growthOverFindings([finding(0, 4), finding(1, 5)]).status).toBe('refused');
    expect(growthOverFindings([finding(0, 4), finding(2, 5), finding(1, 5)]).status).toBe(
      'refused',
    );
    expect(
      growthOverFindings(
        [0, 1, 2].map((t) => finding(t, 4)),
        0,
      ).status,
    ).toBe('refused');
  });
});

describe('growth against its prediction', () => {
  it.each([
    [3, 0.7, 1, 0.3, 'faster than predicted'],
    [1.2, 0.7, 1, 0.3, 'as predicted'],
    [0, 0.3, 2, 0.4, 'slower than predicted'],
    [0.4, 0.7, 0.2, 0.1, 'not resolvable'],
  ])('measured %d ± %d against %d ± %d is %s', (m, sm, p, sp, expected) => {
    const answer = compareWithPrediction({ changeMm: m, sdMm: sm }, { changeMm: p, sdMm: sp });
    expect(answer.status === 'compared' && answer.finding).toBe(expected);
    expect(answer.status === 'compared' && answer.z).toBeCloseTo((m - p) / Math.hypot(sm, sp), 12);
  });

  it('shows both numbers and what follows', () => {
    const answer = compareWithPrediction({ changeMm: 3, sdMm: 0.7 }, { changeMm: 1, sdMm: 0.3 });
    expect(answer.status === 'compared' && answer.words).toMatch(
      /no longer holds.*Measured 3\.00 mm, predicted 1\.00 mm \(z = 2\.6\)/,
    );
  });

  it('is refused without an error of the measurement, or with a negative prediction', () => {
    const good = { changeMm: 1, sdMm: 0.5 };
    expect(compareWithPrediction({ changeMm: 1, sdMm: 0 }, good).status).toBe('refused');
    expect(compareWithPrediction(good, { changeMm: -1, sdMm: 0.5 }).status).toBe('refused');
    expect(compareWithPrediction(good, { changeMm: Number.NaN, sdMm: 0.5 }).status).toBe('refused');
  });
});
