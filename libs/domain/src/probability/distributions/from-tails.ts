import { normalBelow, normalQuantile } from '../../numerics/normal-distribution';
import type { Distribution } from './distribution';

/** What a distribution given by its two tails has to say. */
export interface Tails {
  readonly mean: number;
  readonly sd: number;
  readonly density: (x: number) => number;
  readonly below: (x: number) => number;
  readonly above: (x: number) => number;
  /** Value not exceeded with probability p. */
  readonly atLower: (p: number) => number;
  /** Value exceeded with probability q. */
  readonly atUpper: (q: number) => number;
}

/** A distribution from its tails; each half is reached from its own side, so that no tail is lost to rounding. */
export const fromTails = ({ atLower, atUpper, ...rest }: Tails): Distribution => ({
  ...rest,
  quantile: (p) => (p <= 0.5 ? atLower(p) : atUpper(1 - p)),
  fromNormal: (u) => (u <= 0 ? atLower(normalBelow(u)) : atUpper(normalBelow(-u))),
  toNormal: (x) => {
    const p = rest.below(x);
    return p <= 0.5 ? normalQuantile(p) : -normalQuantile(rest.above(x));
  },
});
