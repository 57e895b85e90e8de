import { firstCrossing } from '../numerics/first-crossing';

/** The through-wall extent at which the flaw would stop being acceptable, its length as it is. */
export interface LimitingHeight {
  readonly heightMm: number | null;
  readonly because: string;
}

export interface HeightSearch {
  /** Room to the diagram's line for a flaw of this height, above 0 inside. */
  readonly margin: (height: number) => number;
  /** Largest height the solutions hold for, and in words what ends them there. */
  readonly largest: number;
  readonly largestBecause: string;
}

/** First height, from a small one up, that reaches the line; or the end of validity before that. */
export function limitingHeight({ margin, largest, largestBecause }: HeightSearch): LimitingHeight {
  const crossing = firstCrossing(margin, largest * 1e-3, largest, {
    intervals: 40,
    tolerance: 1e-9,
  });
  switch (crossing.status) {
    case 'found':
      return { heightMm: crossing.x, because: 'The flaw reaches the line of the diagram there.' };
    case 'none':
      return { heightMm: largest, because: largestBecause };
    case 'below from the start':
      return {
        heightMm: null,
        because: 'Even a very small flaw of this length is outside the diagram.',
      };
    case 'not a number':
      return { heightMm: null, because: 'No limiting height could be found.' };
  }
}
