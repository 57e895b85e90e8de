import { dayText } from './day-text';

/** A sentence with its calendar dates (2026-11-10) as a reader writes them (10 Nov 2026). */
export const daysInWords = (sentence: string): string =>
  sentence.replaceAll(/\b\d{4}-\d{2}-\d{2}\b/g, (day) => dayText(day));
