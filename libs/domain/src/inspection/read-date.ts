/** A date as year-month-day, or why it cannot be read for certain. */
export type DateResult =
  | { readonly state: 'date'; readonly date: string }
  | { readonly state: 'missing' }
  | { readonly state: 'unreadable'; readonly why: string };

/** Reads ISO dates, and day.month.year with points; anything that could be read in two ways is not guessed. */
export function readDate(cell: string): DateResult {
  const text = cell.trim();
  if (text === '') return { state: 'missing' };
  const iso = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  const points = /^(\d{1,2})\.(\d{1,2})\.(\d{4})$/.exec(text);
  if (iso) return existing(Number(iso[1]), Number(iso[2]), Number(iso[3]), text);
  if (points) return existing(Number(points[3]), Number(points[2]), Number(points[1]), text);
  if (/^\d{1,2}\/\d{1,2}\/\d{2,4}$/.test(text)) {
    return {
      state: 'unreadable',
      why: `“${text}” may be day/month or month/day: write it as year-month-day`,
    };
  }
  if (/^\d{5}$/.test(text)) {
    return {
      state: 'unreadable',
      why: `“${text}” is a spreadsheet’s day number: write it as year-month-day`,
    };
  }
  return { state: 'unreadable', why: `“${text}” is not a date: write it as year-month-day` };
}

function existing(year: number, month: number, day: number, text: string): DateResult {
  const date = new Date(Date.UTC(year, month - 1, day));
  const real =
    date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
  return real
    ? { state: 'date', date: date.toISOString().slice(0, 10) }
    : { state: 'unreadable', why: `“${text}” does not exist in the calendar` };
}
