import { daysBetween, type CalendarDate } from './calendar-date';

export type DueUrgency = 'overdue' | 'due soon' | 'later';

/** How near a due date is: overdue from the day after it, due soon within the site's number of days. */
export function urgencyOf(
  dueOn: CalendarDate,
  today: CalendarDate,
  dueSoonDays: number,
): DueUrgency {
  const left = daysBetween(today, dueOn);
  if (left < 0) return 'overdue';
  return left <= dueSoonDays ? 'due soon' : 'later';
}
