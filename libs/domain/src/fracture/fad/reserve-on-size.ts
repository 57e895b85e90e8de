import { firstCrossing } from '../../numerics/first-crossing';

/** Factor on the size of the flaw, and what ends it. */
export interface SizeReserve {
  readonly factor: number;
  /**
   * `line`: the flaw grown by the factor reaches the line; `validity`: it is still inside at the largest size the
   * solutions hold for; `smallest`: even the smallest flaw tried is outside, the factor is then 0.
   */
  readonly end: 'line' | 'validity' | 'smallest';
}

/** The smallest flaw tried: a hundredth of the one assessed. */
const SMALLEST = 0.01;

/**
 * Factor on the flaw size that first brings the point to the line, depth and length grown alike. Below 1 when
 * outside. Counted up from a hundredth of the flaw, so that a larger flaw never hides a smaller one.
 */
export function reserveOnSize(margin: (factor: number) => number, largest: number): SizeReserve {
  if (!Number.isFinite(largest) || largest <= SMALLEST) return { factor: 0, end: 'smallest' };
  const crossing = firstCrossing(margin, SMALLEST, largest, { tolerance: 1e-10 });
  switch (crossing.status) {
    case 'found':
      return { factor: crossing.x, end: 'line' };
    case 'none':
      return { factor: largest, end: 'validity' };
    case 'below from the start':
    case 'not a number':
      return { factor: 0, end: 'smallest' };
  }
}
