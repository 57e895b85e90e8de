import { dormandPrince, type Stepper } from '../numerics/dormand-prince';
import { findRoot } from '../numerics/find-root';
import type { Rates } from './growth-rates';

/** Rates of a flaw of this size after so many years; what does not change with time leaves the years out. */
export type RatesAt = (a: number, c: number, into: Rates, years: number) => void;

/** State of the growing flaw: years, ln a, ln c. */
export type GrowthStateVector = Float64Array;

/** A quantity above 0 before an event and 0 at it. */
export interface StateEvent {
  readonly key: string;
  readonly margin: (state: GrowthStateVector) => number;
}

export const sizeIn = (state: GrowthStateVector) => ({
  years: state[0] as number,
  a: Math.exp(state[1] as number),
  c: Math.exp(state[2] as number),
});

/**
 * Stepper over the way of the flaw. The step variable is the larger of d ln a and d ln c: a flaw whose
 * deepest point lies under the threshold while its ends grow is then no special case. Where nothing grows
 * the years become infinite.
 */
export function growthStepper(rates: RatesAt, counted: () => void): Stepper {
  const rate: Rates = { a: 0, c: 0 };
  return dormandPrince(3, (y, slope) => {
    const a = Math.exp(y[1] as number);
    const c = Math.exp(y[2] as number);
    rates(a, c, rate, y[0] as number);
    counted();
    const ra = rate.a / a;
    const rc = rate.c / c;
    const fastest = Math.max(ra, rc);
    slope[0] = 1 / fastest;
    slope[1] = fastest > 0 ? ra / fastest : 0;
    slope[2] = fastest > 0 ? rc / fastest : 0;
  });
}

/** Error of the last step as a multiple of what is allowed: relative in time, in the logarithm of the sizes. */
export function stepError({ next, error }: Stepper, tolerance: number): number {
  const years = Math.abs(error[0] as number) / (tolerance * Math.abs(next[0] as number) + 1e-12);
  const depth = Math.abs(error[1] as number) / tolerance;
  const length = Math.abs(error[2] as number) / tolerance;
  return Math.max(years, depth, length);
}

/** The earliest event inside the step, found by stepping again from its start with a shorter step. */
export function firstEvent(
  stepper: Stepper,
  y: GrowthStateVector,
  h: number,
  events: readonly StateEvent[],
): { readonly key: string; readonly h: number } | null {
  const end = Float64Array.from(stepper.next);
  let first: { key: string; h: number } | null = null;
  for (const { key, margin } of events) {
    if (margin(end) > 0) continue;
    const after = (length: number) => {
      if (length === 0) return margin(y);
      stepper.step(y, length);
      return margin(stepper.next);
    };
    const root = findRoot(after, 0, h, { tolerance: 1e-12 });
    // a margin already spent at the start of the step ends it there
    const length = root.status === 'found' ? root.x : 0;
    if (!first || length < first.h) first = { key, h: length };
  }
  return first;
}
