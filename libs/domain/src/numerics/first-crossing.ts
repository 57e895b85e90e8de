import { findRoot, type RootOptions } from './find-root';

/** Where a function that starts above zero first reaches it. */
export interface Crossing {
  /** `below from the start`: already at or under zero; `none`: stays above zero on every scanned interval. */
  readonly status: 'found' | 'below from the start' | 'none' | 'not a number';
  readonly x: number;
}

/**
 * First place between low and high where f falls to zero: the range is scanned in equal intervals from
 * below, and the first that holds a change of sign is searched. A later crossing never hides an earlier
 * one that spans a whole interval.
 */
export function firstCrossing(
  f: (x: number) => number,
  low: number,
  high: number,
  { intervals = 24, ...options }: RootOptions & { readonly intervals?: number } = {},
): Crossing {
  const first = f(low);
  if (Number.isNaN(first)) return { status: 'not a number', x: Number.NaN };
  if (first <= 0) return { status: 'below from the start', x: low };
  let left = low;
  for (let i = 1; i <= intervals; i++) {
    const right = low + ((high - low) * i) / intervals;
    const value = f(right);
    if (Number.isNaN(value)) return { status: 'not a number', x: Number.NaN };
    if (value <= 0) {
      const root = findRoot(f, left, right, options);
      return root.status === 'found'
        ? { status: 'found', x: root.x }
        : { status: 'found', x: left };
    }
    left = right;
  }
  return { status: 'none', x: high };
}
