import type { HistoryEntry } from '@ligament/domain/contract/history';
import { daysOfEntries, timeOf } from './days-of-entries';

const entry = (seq: number, at: string) => ({ seq, at }) as HistoryEntry;

describe('entries under their days', () => {
  const late = entry(2, '2026-06-30T23:30:00.000Z');
  const early = entry(1, '2026-06-30T10:00:00.000Z');

  it('stand under the day at the site, not the day in Greenwich', () => {
    expect(daysOfEntries([late, early], 'Europe/London').map(({ day }) => day)).toEqual([
      '1 Jul 2026',
      '30 Jun 2026',
    ]);
    expect(daysOfEntries([late, early], 'UTC')).toEqual([
      { day: '30 Jun 2026', entries: [late, early] },
    ]);
  });

  it('carry the clock time at the site', () => {
    expect(timeOf(late.at, 'Europe/London')).toBe('00:30');
  });
});
