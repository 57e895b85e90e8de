import fc from 'fast-check';
import type { RemainingLife } from '../assessment/assessment-outcome';
import { daysBetween, yearsAfter } from './calendar-date';
import type { IntervalPolicy } from './interval-policy';
import {
  isBeyondLimit,
  proposeReinspection,
  type ReinspectionSubject,
} from './propose-reinspection';

const POLICY: IntervalPolicy = {
  lifeFraction: 0.5,
  codeMaximumMonths: 120,
  maximumMonthsByMechanism: {
    fatigue: 24,
    'stress corrosion cracking': 12,
    unknown: 12,
    'fabrication, not growing': 60,
  },
};
const life = (over: Partial<RemainingLife> = {}): RemainingLife => ({
  years: 1.4,
  cycles: 5880,
  end: 'limit reached',
  because: 'The growing flaw reaches the line.',
  firstEventYears: null,
  ...over,
});
const propose = (over: Partial<ReinspectionSubject> = {}) =>
  proposeReinspection({
    inspectedOn: '2026-11-10',
    life: life(),
    mechanism: 'fatigue',
    policy: POLICY,
    ...over,
  });

function proposed(over: Partial<ReinspectionSubject> = {}) {
  const answer = propose(over);
  if (answer.status !== 'proposed') throw new Error(answer.reason);
  return answer;
}

describe('proposeReinspection', () => {
  it('takes half of a short life from the inspection date', () => {
    const answer = proposed();
    expect(answer.dueOn).toBe('2027-07-23');
    expect(answer.limitOn).toBe('2028-04-04');
    expect(answer.basis).toBe(
      'Half of the remaining life of 1.4 years from the inspection on 2026-11-10: 2027-07-23.',
    );
  });

  it('gives no re-inspection date when the flaw is already unacceptable', () => {
    expect(propose({ life: life({ years: null, end: 'already at limit' }) })).toEqual({
      status: 'no date',
      reason: expect.stringMatching(/repair before service/),
    });
  });

  it('lets the site cap for stress corrosion govern over a longer life', () => {
    const answer = proposed({
      inspectedOn: '2026-10-20',
      mechanism: 'stress corrosion cracking',
      life: life({ years: 5.4 }),
    });
    expect(answer.dueOn).toBe('2027-10-20');
    expect(answer.candidates.find(({ governs }) => governs)?.rule).toBe('mechanism maximum');
  });

  it('takes half of the time to breaking the surface when that is sooner', () => {
    const answer = proposed({
      inspectedOn: '2026-09-08',
      mechanism: 'fabrication, not growing',
      life: life({ years: 15, firstEventYears: 3.1 }),
    });
    expect(answer.dueOn).toBe('2028-03-27');
    expect(answer.basis).toMatch(/change category/);
  });

  it('lets the end of a temporary measure govern', () => {
    expect(proposed({ temporaryUntil: '2027-05-28' }).dueOn).toBe('2027-05-28');
  });

  it('treats a mechanism without a rule as unknown', () => {
    const answer = proposed({ mechanism: 'erosion', life: life({ years: 30 }) });
    expect(answer.dueOn).toBe('2027-11-10');
    expect(answer.basis).toMatch(/unknown mechanism/);
  });

  it('never goes beyond the code maximum', () => {
    const policy = { ...POLICY, codeMaximumMonths: 6 };
    expect(proposed({ policy }).dueOn).toBe('2027-05-10');
  });

  it('has no limit date for a flaw that was not seen to reach a limit', () => {
    const answer = proposed({ life: life({ years: 40, end: 'horizon' }) });
    expect(answer.limitOn).toBeNull();
    expect(answer.candidates[0]?.explanation).toMatch(/at least 40 years/);
  });

  it('shows every rule that was looked at, and marks what governs', () => {
    const answer = proposed({ life: life({ firstEventYears: 1 }), temporaryUntil: '2030-01-01' });
    expect(answer.candidates.map(({ rule }) => rule)).toEqual([
      'fraction of life',
      'mechanism maximum',
      'code maximum',
      'fraction of time to change of category',
      'temporary measure',
    ]);
    for (const { governs, dueOn } of answer.candidates)
      expect(governs).toBe(dueOn === answer.dueOn);
  });

  it('is never later than any rule, than the limit, nor than the exact fraction of life', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 40, noNaN: true }),
        fc.integer({ min: 0, max: 20_000 }),
        (years, shift) => {
          const inspectedOn = yearsAfter('1990-01-01', shift / 365.25);
          const answer = proposed({ inspectedOn, life: life({ years }) });
          expect(answer.candidates.every(({ dueOn }) => answer.dueOn <= dueOn)).toBe(true);
          expect(isBeyondLimit(answer.dueOn, answer.limitOn)).toBe(false);
          expect(daysBetween(inspectedOn, answer.dueOn)).toBeLessThanOrEqual(0.5 * years * 365.25);
        },
      ),
    );
  });
});
