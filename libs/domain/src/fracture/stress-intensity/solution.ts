import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';

/**
 * K per unit of stress at one point of the front [√mm]. Bending counts as positive when the flawed face
 * is in tension; an embedded crack feels its two signs differently, so both have their own factor.
 */
export interface Influence {
  membrane: number;
  bending: number;
  /** K per unit of bending that puts the flawed face in compression. */
  reversedBending: number;
}

/** One published K solution: what it is, whose, between which limits, and the function over the front. */
export interface StressIntensitySolution {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** Formula in words or symbols, for the calculation sheet. */
  readonly formula: string;
  /** How good it was found to be, in words. */
  readonly accuracy: string;
  readonly limits: readonly Limit[];
  /** Writes K per unit of stress at the angle φ (90° = deepest) into `into`; allocates nothing. */
  readonly influence: (crack: Crack, angle: Degrees, into: Influence) => void;
}

/** K from membrane and bending stress [MPa·√mm]; compression closes the crack, K is then 0. */
export function combine(influence: Influence, membrane: number, bending: number): number {
  const bent = bending >= 0 ? bending * influence.bending : -bending * influence.reversedBending;
  return Math.max(membrane * influence.membrane + bent, 0);
}
