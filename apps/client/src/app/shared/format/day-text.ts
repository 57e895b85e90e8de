const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** A calendar date as 10 Nov 2026; no time zone touches it. */
export function dayText(date: string | null | undefined): string {
  const [year, month, day] = (date ?? '').slice(0, 10).split('-').map(Number);
  const name = MONTHS[(month ?? 0) - 1];
  return year && name && day ? `${day} ${name} ${year}` : '—';
}

/** An instant as 10 Nov 2026, 14:05 in a time zone. */
export function momentText(instant: string | null | undefined, timeZone = 'UTC'): string {
  if (!instant) return '—';
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  }).formatToParts(new Date(instant));
  const part = (type: string) => parts.find((each) => each.type === type)?.value ?? '';
  return `${part('day')} ${part('month')} ${part('year')}, ${part('hour')}:${part('minute')}`;
}
