import { addDays, addMonths, differenceInCalendarDays, format, isValid, parse } from 'date-fns';

/** A day without time, `2027-07-23`. */
export type CalendarDate = string;

const FORM = 'yyyy-MM-dd';
// parse fills what the form leaves out from this; a fixed day keeps the answer free of the clock
const REFERENCE = new Date(2000, 0, 1);
const DAYS_PER_YEAR = 365.25;

/** The day as a date object at local midnight, only ever used between two calls of this file. */
export function parseDate(day: CalendarDate): Date {
  const date = parse(day, FORM, REFERENCE);
  if (!/^\d{4}-\d{2}-\d{2}$/.test(day) || !isValid(date)) {
    throw new RangeError(`a calendar date must look like 2027-07-23, got ${day}`);
  }
  return date;
}

const text = (date: Date): CalendarDate => format(date, FORM);

/** Whole months later; the last day of a shorter month, never a day beyond it. */
export const monthsAfter = (day: CalendarDate, months: number): CalendarDate =>
  text(addMonths(parseDate(day), Math.floor(months)));

/** A number of years later, in whole days rounded down so that the date is never late. */
export const yearsAfter = (day: CalendarDate, years: number): CalendarDate =>
  text(addDays(parseDate(day), Math.floor(years * DAYS_PER_YEAR)));

/** Whole days later, or earlier when negative. */
export const daysAfter = (day: CalendarDate, days: number): CalendarDate =>
  text(addDays(parseDate(day), days));

/** Days from one date to another; negative when the second is earlier. */
export const daysBetween = (from: CalendarDate, to: CalendarDate): number =>
  differenceInCalendarDays(parseDate(to), parseDate(from));

// ISO dates stand in the order of time
export const isAfter = (day: CalendarDate, other: CalendarDate): boolean => day > other;
export const earliest = (days: readonly CalendarDate[]): CalendarDate | undefined =>
  [...days].sort()[0];
