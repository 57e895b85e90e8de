/** Calendar date at the site, as year-month-day, of an instant. */
export function siteDay(now: Date, timeZone: string): string {
  // en-CA writes dates as ISO 8601 does
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(now);
}
