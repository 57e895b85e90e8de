/** Damage mechanisms that set a re-inspection interval. */
export const INTERVAL_MECHANISMS = [
  'fatigue',
  'corrosion fatigue',
  'thermal fatigue',
  'stress corrosion cracking',
  'fabrication, not growing',
  'unknown',
] as const;
export type IntervalMechanism = (typeof INTERVAL_MECHANISMS)[number];

/** The site's rules for intervals; every figure is the owner's, none is built in. */
export interface IntervalPolicy {
  /** Fraction of the remaining life after which the flaw is looked at again. */
  readonly lifeFraction: number;
  /** Longest interval by mechanism [months]; a mechanism without one takes that of `unknown`. */
  readonly maximumMonthsByMechanism: Readonly<Partial<Record<string, number>>>;
  /** Longest interval whatever the rest says [months]. */
  readonly codeMaximumMonths: number;
}
