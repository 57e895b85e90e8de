import type { HistoryEntry } from '@ligament/domain/contract/history';
import { momentText } from '../../shared/format/day-text';

/** The entries of one day at the site. */
export interface HistoryDay {
  readonly day: string;
  readonly entries: readonly HistoryEntry[];
}

/** Entries in their order, under the days on which they were recorded at the site. */
export function daysOfEntries(entries: readonly HistoryEntry[], timeZone: string): HistoryDay[] {
  const days: { day: string; entries: HistoryEntry[] }[] = [];
  for (const entry of entries) {
    const [day = ''] = momentText(entry.at, timeZone).split(',');
    const last = days.at(-1);
    if (last?.day === day) last.entries.push(entry);
    else days.push({ day, entries: [entry] });
  }
  return days;
}

/** Clock time of an entry at the site. */
export const timeOf = (instant: string, timeZone: string): string =>
  momentText(instant, timeZone).split(', ')[1] ?? '';
