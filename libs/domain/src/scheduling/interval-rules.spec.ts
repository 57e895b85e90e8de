import fc from 'fast-check';
import { monthsAfter } from './calendar-date';
import { governingInterval, wholeMonths, type IntervalOutcome } from './interval-outcome';
import {
  factoredLifeInterval,
  growthWindowInterval,
  PIPING_CLASSES,
  pipingThicknessInterval,
  pipingVisualInterval,
  vesselExternalInterval,
  vesselInternalInterval,
} from './interval-rules';

const lives = fc.integer({ min: -2000, max: 8000 }).map((n) => n / 100);
const yearsOf = (outcome: IntervalOutcome) =>
  outcome.status === 'interval' ? outcome.years : outcome.status;

describe('the interval of a vessel', () => {
  it.each([
    [15, 7.5],
    [30, 10],
    [4, 2],
    [3.9, 2],
    [1.5, 1.5],
    [0, 'overdue'],
    [-3, 'overdue'],
  ])('with a remaining life of %d years is %p', (life, expected) => {
    expect(yearsOf(vesselInternalInterval(life))).toBe(expected);
  });

  it('outside is five years at most', () => {
    expect(yearsOf(vesselExternalInterval(30))).toBe(5);
    expect(yearsOf(vesselExternalInterval(6))).toBe(3);
    expect(yearsOf(vesselExternalInterval(-1))).toBe('overdue');
  });
});

describe('the interval of piping', () => {
  it.each([
    [1, 15, 5],
    [2, 15, 7.5],
    [2, 30, 10],
    [3, 15, 7.5],
    [1, 0, 'overdue'],
    [4, 15, 'not required'],
  ] as const)('of class %d with a life of %d years is %p', (pipingClass, life, expected) => {
    expect(yearsOf(pipingThicknessInterval(pipingClass, life))).toBe(expected);
  });

  it('seen from outside depends on the class alone', () => {
    expect(PIPING_CLASSES.map((each) => yearsOf(pipingVisualInterval(each)))).toEqual([
      5,
      5,
      10,
      'not required',
    ]);
  });
});

describe('every rule', () => {
  const rules = fc.constantFrom(
    vesselInternalInterval,
    vesselExternalInterval,
    (life: number) => pipingThicknessInterval(1, life),
    growthWindowInterval,
    (life: number) => factoredLifeInterval(life, 3),
  );

  it('never gives an interval below 0 or beyond the life, and calls a spent life overdue', () => {
    fc.assert(
      fc.property(rules, lives, (rule, life) => {
        const outcome = rule(life);
        expect(outcome.status).toBe(life > 0 ? 'interval' : 'overdue');
        if (outcome.status !== 'interval') return;
        expect(outcome.years).toBeLessThanOrEqual(life);
        expect(outcome.months).toBeGreaterThanOrEqual(0);
        expect(outcome.months / 12).toBeLessThanOrEqual(outcome.years + 1e-9);
      }),
    );
  });

  it('says where it comes from', () => {
    fc.assert(
      fc.property(rules, lives, (rule, life) => {
        const outcome = rule(life);
        expect(outcome.status !== 'refused' && outcome.source).toMatch(
          /from memory|Eurocode 9|API 570|common practice/,
        );
      }),
    );
  });

  it.each([Number.NaN, Infinity, 5000])('refuses a life of %d years by name', (life) => {
    for (const rule of [vesselInternalInterval, vesselExternalInterval, growthWindowInterval]) {
      const outcome = rule(life);
      expect(outcome.status === 'refused' && outcome.refusals[0]?.input).toMatch(
        /remainingLifeYears|detectableToCriticalYears/,
      );
    }
    expect(pipingThicknessInterval(2, life).status).toBe('refused');
    expect(factoredLifeInterval(life, 2).status).toBe('refused');
  });

  it('refuses a factor on life below 1', () => {
    const outcome = factoredLifeInterval(10, 0.5);
    expect(outcome.status === 'refused' && outcome.refusals[0]?.input).toBe('factorOnLife');
  });
});

describe('whole months', () => {
  it.each([
    [9.35, 112],
    [5.6, 67],
    [7, 84],
    [7 / 12, 7],
    [0.05, 0],
    [-1, 0],
  ])('in %d years are %d, rounded down', (years, months) => {
    expect(wholeMonths(years)).toBe(months);
  });

  it('lead to a date that is never late', () => {
    expect(monthsAfter('2003-05-31', wholeMonths(5.6))).toBe('2008-12-31');
  });
});

describe('several rules together', () => {
  it('are governed by the shortest, by what is overdue before that, by a refusal first', () => {
    const [short, long] = [vesselInternalInterval(3), vesselInternalInterval(20)];
    const [late, optional] = [vesselInternalInterval(0), pipingVisualInterval(4)];
    const refusal = vesselInternalInterval(Number.NaN);
    expect(governingInterval([long, optional, short])).toBe(short);
    expect(governingInterval([long, late, short])).toBe(late);
    expect(governingInterval([late, refusal, short])).toBe(refusal);
    expect(governingInterval([optional])).toBe(optional);
    expect(governingInterval([])).toBeNull();
  });
});
