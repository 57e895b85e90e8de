import { daysBetween, type CalendarDate } from './calendar-date';

/** What a site's rules say of reminders. */
export interface ReminderPolicy {
  /** Days before the due date at which a reminder is sent [day]. */
  readonly reminderLeadDays: readonly number[];
  /** Whether a reminder is sent every day while overdue. */
  readonly remindWhileOverdue: boolean;
}

/**
 * The reminder stage that a due date has reached on a day: the shortest lead time reached, negative days when overdue,
 * or null when none is reached yet. Of several missed stages only the newest counts, so that a late start neither floods
 * nor loses.
 */
export function reminderStage(
  dueOn: CalendarDate,
  today: CalendarDate,
  policy: ReminderPolicy,
): number | null {
  const left = daysBetween(today, dueOn);
  if (left < 0) return policy.remindWhileOverdue ? left : -1;
  const reached = policy.reminderLeadDays.filter((lead) => left <= lead);
  return reached.length > 0 ? Math.min(...reached) : null;
}
