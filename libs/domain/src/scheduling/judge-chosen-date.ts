import { isAfter, type CalendarDate } from './calendar-date';

export interface ChosenDate {
  readonly proposed: CalendarDate;
  readonly chosen: CalendarDate;
  /** Day the flaw is predicted to reach its limit; null when it does not within the horizon. */
  readonly limitOn: CalendarDate | null;
  readonly reason: string;
}

export type ChosenDateJudgement =
  | { readonly allowed: true; readonly kind: 'as proposed' | 'earlier' | 'later with reason' }
  | {
      readonly allowed: false;
      readonly problem: 'after the limit' | 'reason missing';
      readonly message: string;
    };

const SHORTEST_REASON = 3;

/** Judges a date an engineer chose: earlier is free, later needs a reason, beyond the predicted limit is refused. */
export function judgeChosenDate({
  proposed,
  chosen,
  limitOn,
  reason,
}: ChosenDate): ChosenDateJudgement {
  if (limitOn !== null && isAfter(chosen, limitOn)) {
    return {
      allowed: false,
      problem: 'after the limit',
      message: `The flaw is predicted to reach its limit on ${limitOn}: choose a date not after it.`,
    };
  }
  if (!isAfter(chosen, proposed)) {
    return { allowed: true, kind: chosen === proposed ? 'as proposed' : 'earlier' };
  }
  if (reason.trim().length < SHORTEST_REASON) {
    return {
      allowed: false,
      problem: 'reason missing',
      message: `A date after the proposed ${proposed} needs a reason.`,
    };
  }
  return { allowed: true, kind: 'later with reason' };
}
