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

/**
 * K per unit of a stress that varies through the wall as (x/t)ⁿ, x from the flawed face [√mm]:
 * n = 2, 3, 4. Together with membrane and bending they carry any polynomial to the fourth degree.
 */
export interface HigherInfluence {
  quadratic: number;
  cubic: number;
  quartic: number;
}

/**
 * How the front lies in the wall, and so what can grow: an ellipse grows at its deepest point (φ = 90°) and
 * at its ends (φ = 0°), a straight front only into the wall, a through-wall crack only along it.
 */
export type FrontShape = 'ellipse' | 'straight' | 'through';

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
  readonly front: FrontShape;
  /** Writes K per unit of stress at the angle φ (90° = deepest) into `into`; allocates nothing. */
  readonly influence: (crack: Crack, angle: Degrees, into: Influence) => void;
  /** Writes K per unit of the higher stress terms; null where the source gives membrane and bending only. */
  readonly higher: ((crack: Crack, angle: Degrees, into: HigherInfluence) => void) | null;
}

/** K from membrane and bending stress [MPa·√mm]; compression closes the crack, K is then 0. */
export function combine(influence: Influence, membrane: number, bending: number): number {
  const bent = bending >= 0 ? bending * influence.bending : -bending * influence.reversedBending;
  return Math.max(membrane * influence.membrane + bent, 0);
}
