import { daysAfter, daysBetween, type CalendarDate } from './calendar-date';

/** A shutdown window; both days belong to it. */
export interface Window {
  readonly startsOn: CalendarDate;
  readonly endsOn: CalendarDate;
}

/** How a due date and a window meet. */
export interface WindowFit {
  /** `partly`: the work must be finished within the first days of the window. */
  readonly fit: 'fits' | 'partly' | 'too late';
  /** Days from the start of the window to the last possible finish; negative when the window is too late. */
  readonly daysUsable: number;
  /** Last day the work may finish: due date less the days for report and assessment. */
  readonly finishBy: CalendarDate;
}

/** Whether work due by a date can be done in a window, with days kept for the report before the due date. */
export function fitsWindow(
  dueOn: CalendarDate,
  { startsOn, endsOn }: Window,
  reportingDays = 0,
): WindowFit {
  const finishBy = daysAfter(dueOn, -reportingDays);
  const daysUsable = daysBetween(startsOn, finishBy);
  const whole = daysBetween(startsOn, endsOn);
  const fit = daysUsable < 0 ? 'too late' : daysUsable < whole ? 'partly' : 'fits';
  return { fit, daysUsable, finishBy };
}
