import type { Distribution } from './distribution';
import { fromTails } from './from-tails';

/** Uniform distribution between two values. */
export function uniform(low: number, high: number): Distribution {
  const width = high - low;
  const share = (x: number) => Math.min(Math.max(x / width, 0), 1);
  return fromTails({
    mean: (low + high) / 2,
    sd: width / Math.sqrt(12),
    density: (x) => (x >= low && x <= high ? 1 / width : 0),
    below: (x) => share(x - low),
    above: (x) => share(high - x),
    atLower: (p) => low + width * p,
    atUpper: (q) => high - width * q,
  });
}
