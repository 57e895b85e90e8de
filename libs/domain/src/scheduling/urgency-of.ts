import { differenceInCalendarDays, parseISO } from 'date-fns';

/** How pressing a due date is on a day; all dates are calendar dates, year-month-day. */
export type UrgencyWord = 'overdue' | 'due soon' | 'later';

/**
 * Days from one calendar date to another; negative when the second lies before the first.
 * @param from calendar date [year-month-day]
 * @param to calendar date [year-month-day]
 * @returns whole days [day]
 * @validity any two calendar dates
 * @source definition
 * @example daysBetween('2026-12-01', '2026-12-15') // 14
 */
export function daysBetween(from: string, to: string): number {
  return differenceInCalendarDays(parseISO(to), parseISO(from));
}

/**
 * How pressing a due date is: past it, within the site's notice, or later.
 * @param dueOn due date [year-month-day]
 * @param today day it is judged on [year-month-day]
 * @param dueSoonDays the site's notice [day]
 * @returns the word for it [-]
 * @validity any two calendar dates
 * @source common practice: a due date is kept when the work is done on it, and passed the day after
 * @example urgencyOf('2026-12-15', '2026-12-01', 90) // 'due soon'
 */
export function urgencyOf(dueOn: string, today: string, dueSoonDays: number): UrgencyWord {
  const days = daysBetween(today, dueOn);
  if (days < 0) return 'overdue';
  return days <= dueSoonDays ? 'due soon' : 'later';
}
