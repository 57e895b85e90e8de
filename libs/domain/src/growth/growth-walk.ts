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
 * Stepper over the way of the flaw, s = ln a + ln c: ds/dt is above 0 while either point of the front grows, so
 * that a flaw whose deepest point lies under the threshold while its ends grow is no special case, and nothing
 * jumps where one point overtakes the other. Where nothing grows the years become infinite.
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
    const both = ra + rc;
    slope[0] = 1 / both;
    slope[1] = both > 0 ? ra / both : 0;
    slope[2] = both > 0 ? rc / both : 0;
  });
}

/** Way after which the years still to come no longer count. */
const AHEAD = 0.5;

/**
 * Error of the last step as a multiple of what is allowed: relative in time; in the logarithm of the sizes by the
 * share of the life that is still to come, the only part a wrong size can spoil.
 */
export function stepError({ next, error, last }: Stepper, tolerance: number): number {
  const gone = next[0] as number;
  const years = Math.abs(error[0] as number) / (tolerance * Math.abs(gone) + 1e-12);
  const ahead = AHEAD * (last[0] as number);
  const weight = Number.isFinite(ahead) ? ahead / (gone + ahead) : 1;
  const depth = Math.abs(error[1] as number);
  const length = Math.abs(error[2] as number);
  return Math.max(years, (weight * Math.max(depth, length)) / (SIZE_SHARE * tolerance));
}

/** A wrong size costs several times as much life, by the exponent of the law. */
const SIZE_SHARE = 0.3;

/** The earliest event inside the step, found by stepping again from its start with a shorter step. */
export function firstEvent(
  stepper: Stepper,
  y: GrowthStateVector,
  h: number,
  events: readonly StateEvent[],
): { readonly key: string; readonly h: number } | null {
  const end = Float64Array.from(stepper.next);
  const after = ({ margin }: StateEvent, length: number) => {
    if (length === 0) return margin(y);
    stepper.step(y, length);
    return margin(stepper.next);
  };
  const found = events
    .filter(({ margin }) => !(margin(end) > 0))
    .map((event) => ({ key: event.key, h: crossing(event, after, 0, h) }));
  return earliest(found, ({ h: length }) => length);
}

/**
 * The earliest event inside the step just taken, by the curve through it: no rate is asked for. Margins are looked
 * at in so many places of the step; between two of them one is not seen to fall and rise again.
 */
export function firstEventOnCurve(
  stepper: Stepper,
  y: GrowthStateVector,
  h: number,
  events: readonly StateEvent[],
  looks: number,
): { readonly key: string; readonly share: number } | null {
  const state = new Float64Array(y.length);
  const marginAt = (event: StateEvent, share: number) => {
    if (share === 1) return event.margin(stepper.next);
    stepper.between(y, h, share, state);
    return event.margin(state);
  };
  for (let look = 1; look <= looks; look++) {
    const [from, to] = [(look - 1) / looks, look / looks];
    const found = events
      .filter((event) => !(marginAt(event, to) > 0))
      .map((event) => ({ key: event.key, share: crossing(event, marginAt, from, to) }));
    const first = earliest(found, ({ share }) => share);
    if (first) return first;
  }
  return null;
}

function earliest<T>(found: readonly T[], place: (one: T) => number): T | null {
  return found.reduce<T | null>(
    (first, one) => (first && place(first) <= place(one) ? first : one),
    null,
  );
}

function crossing(
  event: StateEvent,
  marginAt: (event: StateEvent, share: number) => number,
  from: number,
  to: number,
): number {
  const root = findRoot((share) => marginAt(event, share), from, to, { tolerance: 1e-12 });
  // a margin already spent at the start of the stretch ends it there
  return root.status === 'found' ? root.x : from;
}
