import { addDays, format, parseISO } from 'date-fns';

const SOON_DAYS = 60;

/** Words beside a certificate that has run out or soon will; empty while it is good or none is needed. */
export function certificateWarning(validUntil: string | null, today: string): string {
  if (validUntil === null) return '';
  if (validUntil < today) return 'expired';
  const soon = format(addDays(parseISO(today), SOON_DAYS), 'yyyy-MM-dd');
  return validUntil <= soon ? 'expires soon' : '';
}
