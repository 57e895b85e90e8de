/** Maps calendar dates to places on a time axis. */
export interface BoardScale {
  readonly from: string;
  readonly to: string;
  /** Place of a date from 0 at the left to 100 at the right, kept inside. */
  readonly place: (date: string) => number;
  readonly years: readonly { readonly year: number; readonly place: number }[];
}

const days = (date: string): number => Date.parse(`${date}T00:00:00Z`) / 86_400_000;

/** An axis that begins a little before today (or the earliest date) and shows the next years up to the last due date. */
export function boardScale(today: string, dates: readonly string[]): BoardScale {
  const all = [today, ...dates].sort();
  const first = days(all[0] ?? today);
  const last = days(all.at(-1) ?? today);
  const span = Math.max(365, last - first);
  const from = first - 0.03 * span;
  const to = last + 0.08 * span;
  const place = (date: string) =>
    Math.min(100, Math.max(0, ((days(date) - from) / (to - from)) * 100));
  const text = (day: number) => new Date(day * 86_400_000).toISOString().slice(0, 10);
  const firstYear = Number(text(from).slice(0, 4)) + 1;
  const lastYear = Number(text(to).slice(0, 4));
  const step = lastYear - firstYear > 12 ? 2 : 1;
  const years = [];
  for (let year = firstYear; year <= lastYear; year += step)
    years.push({ year, place: place(`${year}-01-01`) });
  return { from: text(from), to: text(to), place, years };
}
