/** A continuous random variable, independent of the others. */
export interface Distribution {
  readonly mean: number;
  readonly sd: number;
  readonly density: (x: number) => number;
  /** Probability of a value of x or less. */
  readonly below: (x: number) => number;
  /** Probability of a value above x, with full relative accuracy where it is small. */
  readonly above: (x: number) => number;
  /** Value not exceeded with the probability p; the ends of the range at p = 0 and 1. */
  readonly quantile: (p: number) => number;
  /** The value as unlikely as the standard normal value u, accurate in both tails: F⁻¹(Φ(u)). */
  readonly fromNormal: (u: number) => number;
  /** The standard normal value as unlikely as x: Φ⁻¹(F(x)). */
  readonly toNormal: (x: number) => number;
}

/** A named random variable of a limit state. */
export interface RandomVariable {
  readonly name: string;
  readonly distribution: Distribution;
}
