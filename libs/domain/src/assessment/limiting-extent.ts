import { firstCrossing } from '../numerics/first-crossing';

/** The extent at which the flaw would stop being acceptable, the other as it is [mm]. */
export interface LimitingExtent {
  readonly extent: number | null;
  readonly because: string;
}

export interface ExtentSearch {
  /** Room to the diagram's line for a flaw of this extent, above 0 inside. */
  readonly margin: (extent: number) => number;
  /** Largest extent the solutions hold for, and in words what ends them there. */
  readonly largest: number;
  readonly largestBecause: string;
}

/** First extent, from a small one up, that reaches the line; or the end of validity before that. */
export function limitingExtent({ margin, largest, largestBecause }: ExtentSearch): LimitingExtent {
  const crossing = firstCrossing(margin, largest * 1e-3, largest, {
    intervals: 40,
    tolerance: 1e-9,
  });
  switch (crossing.status) {
    case 'found':
      return { extent: crossing.x, because: 'The flaw reaches the line of the diagram there.' };
    case 'none':
      return { extent: largest, because: largestBecause };
    case 'below from the start':
      return {
        extent: null,
        because: 'Even a very small flaw is outside the diagram.',
      };
    case 'not a number':
      return { extent: null, because: 'No limiting size could be found.' };
  }
}
