import { headerScore } from './recognise-columns';

const FIRST_LINES = 10;

/** Index of the line that holds the column names: the one with most words we know among the first ten. */
export function detectHeader(lines: readonly (readonly string[])[]): number {
  const scores = lines.slice(0, FIRST_LINES).map(headerScore);
  const best = Math.max(0, ...scores);
  return best >= 2 ? scores.indexOf(best) : 0;
}
