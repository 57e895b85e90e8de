import { dayText, momentText } from './day-text';

describe('dayText', () => {
  it('writes a calendar date as it is, in every time zone', () => {
    expect(dayText('2029-09-13')).toBe('13 Sep 2029');
    expect(dayText('2028-02-29')).toBe('29 Feb 2028');
  });

  it('is a dash where there is no date', () => {
    expect([dayText(null), dayText(undefined), dayText(''), dayText('soon')]).toEqual([
      '—',
      '—',
      '—',
      '—',
    ]);
  });
});

describe('momentText', () => {
  it('writes an instant in the time zone of the site', () => {
    expect(momentText('2026-07-01T23:30:00Z', 'Europe/London')).toBe('2 Jul 2026, 00:30');
    expect(momentText('2026-11-10T14:05:00Z')).toBe('10 Nov 2026, 14:05');
  });

  it('is a dash where there is no instant', () => {
    expect(momentText(null)).toBe('—');
  });
});
