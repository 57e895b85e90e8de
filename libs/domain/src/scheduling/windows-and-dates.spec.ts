import { fitsWindow } from './fit-to-window';
import { judgeChosenDate, type ChosenDate } from './judge-chosen-date';
import { urgencyOf } from './urgency';

describe('urgencyOf', () => {
  it.each([
    ['2026-11-30', 'overdue'],
    ['2026-12-01', 'due soon'],
    ['2027-05-30', 'due soon'],
    ['2027-05-31', 'later'],
  ] as const)('calls %s %s on 1 December 2026 with 180 days', (dueOn, urgency) => {
    expect(urgencyOf(dueOn, '2026-12-01', 180)).toBe(urgency);
  });
});

describe('fitsWindow', () => {
  it('fits when the whole window lies before the due date', () => {
    expect(fitsWindow('2027-07-23', { startsOn: '2027-02-08', endsOn: '2027-02-14' }).fit).toBe(
      'fits',
    );
  });

  it('fits when the window ends on the due date', () => {
    expect(fitsWindow('2027-02-14', { startsOn: '2027-02-08', endsOn: '2027-02-14' }).fit).toBe(
      'fits',
    );
  });

  it('is too late with the number of days, when the window starts after the due date', () => {
    const fit = fitsWindow('2027-07-23', { startsOn: '2027-09-06', endsOn: '2027-09-12' });
    expect(fit).toEqual({ fit: 'too late', daysUsable: -45, finishBy: '2027-07-23' });
  });

  it('fits in part when the work must be done in the first days', () => {
    const fit = fitsWindow('2027-05-14', { startsOn: '2027-05-03', endsOn: '2027-05-28' });
    expect(fit).toEqual({ fit: 'partly', daysUsable: 11, finishBy: '2027-05-14' });
  });

  it('keeps the days for report and assessment before the due date', () => {
    const fit = fitsWindow('2027-02-20', { startsOn: '2027-02-08', endsOn: '2027-02-14' }, 15);
    expect(fit).toMatchObject({ fit: 'too late', finishBy: '2027-02-05' });
  });
});

describe('judgeChosenDate', () => {
  const judge = (over: Partial<ChosenDate>) =>
    judgeChosenDate({
      proposed: '2027-07-23',
      chosen: '2027-07-23',
      limitOn: '2028-04-04',
      reason: '',
      ...over,
    });

  it('allows the proposed date and any earlier one without a reason', () => {
    expect(judge({})).toEqual({ allowed: true, kind: 'as proposed' });
    expect(judge({ chosen: '2027-02-10' })).toEqual({ allowed: true, kind: 'earlier' });
  });

  it('allows a later date with a reason only', () => {
    expect(judge({ chosen: '2027-09-06' })).toMatchObject({
      allowed: false,
      problem: 'reason missing',
    });
    expect(judge({ chosen: '2027-09-06', reason: '   ' }).allowed).toBe(false);
    expect(judge({ chosen: '2027-09-06', reason: 'on-stream scan in June' })).toEqual({
      allowed: true,
      kind: 'later with reason',
    });
  });

  it('allows no date after the predicted limit, whatever the reason', () => {
    expect(judge({ chosen: '2028-04-05', reason: 'no window before' })).toMatchObject({
      allowed: false,
      problem: 'after the limit',
      message: expect.stringMatching(/2028-04-04/),
    });
    expect(judge({ chosen: '2028-04-04', reason: 'no window before' }).allowed).toBe(true);
  });

  it('refuses a proposal that itself lies beyond the limit', () => {
    expect(judge({ limitOn: '2027-01-01' }).allowed).toBe(false);
  });

  it('has no limit to hold to when none is predicted', () => {
    expect(judge({ chosen: '2035-01-01', limitOn: null, reason: 'site plan' }).allowed).toBe(true);
  });
});
