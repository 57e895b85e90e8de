import type { Refused } from '../geometry/refusal';

/** What a published rule says about the time to the next inspection. */
export type IntervalOutcome =
  | {
      readonly status: 'interval';
      readonly years: number;
      /** Whole months, rounded down so that a date is never late. */
      readonly months: number;
      /** What gave the number, in words. */
      readonly basis: string;
      readonly source: string;
    }
  /** No life is left: the inspection is due now, there is no interval. */
  | { readonly status: 'overdue'; readonly because: string; readonly source: string }
  /** The rule leaves it to the owner. */
  | { readonly status: 'not required'; readonly because: string; readonly source: string }
  | Refused;

// a year count that was a whole number of months before it was divided must stay one
const ROUNDING = 1e-9;

/** Whole months in a number of years, rounded down, never below 0. */
export const wholeMonths = (years: number): number =>
  Math.max(Math.floor(years * 12 + ROUNDING), 0);

/** An interval; one that is used up is overdue, never negative. */
export const intervalOf = (years: number, basis: string, source: string): IntervalOutcome =>
  years > 0
    ? { status: 'interval', years, months: wholeMonths(years), basis, source }
    : { status: 'overdue', because: `No remaining life is left: ${basis}.`, source };

/** The shortest of several rules governs; anything overdue comes first, a refusal before all. */
export function governingInterval(outcomes: readonly IntervalOutcome[]): IntervalOutcome | null {
  const rank = (outcome: IntervalOutcome): number => {
    switch (outcome.status) {
      case 'refused':
        return -2;
      case 'overdue':
        return -1;
      case 'interval':
        return outcome.years;
      case 'not required':
        return Infinity;
    }
  };
  return outcomes.reduce<IntervalOutcome | null>(
    (best, each) => (best === null || rank(each) < rank(best) ? each : best),
    null,
  );
}
