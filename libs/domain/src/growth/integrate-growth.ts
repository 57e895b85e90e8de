import { dormandPrince, type Stepper } from '../numerics/dormand-prince';
import { findRoot } from '../numerics/find-root';
import type { Rates } from './growth-rates';

/** Something that ends or interrupts growth: its margin is above 0 before and reaches 0 at the event. */
export interface GrowthLimit {
  readonly key: string;
  readonly margin: (a: number, c: number) => number;
}

/** Size of the flaw at one time. */
export interface SizeAt {
  readonly years: number;
  readonly a: number;
  readonly c: number;
}

export interface GrowthOptions {
  readonly horizonYears: number;
  /** Relative error allowed in each step. */
  readonly tolerance?: number;
  /** Longest step in the logarithm of the size. */
  readonly maxStep?: number;
}

/** How growth went and why it is followed no further. */
export interface GrowthRun {
  readonly stop: 'limit' | 'horizon' | 'no growth' | 'step limit';
  /** Key of the limit reached, when the stop is a limit. */
  readonly limit: string | null;
  readonly states: readonly SizeAt[];
  /** Length of the way in the logarithm of the size. */
  readonly distance: number;
  readonly evaluations: number;
}

const SMALLEST_STEP = 1e-5;
const MOST_STEPS = 20_000;

/**
 * Follows depth and half length together, each by its own rate, until a limit is reached. The step
 * variable is the larger of d ln a and d ln c: a flaw whose deepest point lies under the threshold while
 * its ends grow is no special case. Steps are chosen by their estimated error; the end of the last one is
 * found by stepping again onto the limit.
 */
export function integrateGrowth(
  start: { readonly a: number; readonly c: number },
  rates: (a: number, c: number, into: Rates) => void,
  limits: readonly GrowthLimit[],
  { horizonYears, tolerance = 1e-5, maxStep = 0.1 }: GrowthOptions,
): GrowthRun {
  const rate: Rates = { a: 0, c: 0 };
  let evaluations = 0;
  // state: years, ln a, ln c
  const stepper = dormandPrince(3, (y, slope) => {
    const [a, c] = [Math.exp(y[1] as number), Math.exp(y[2] as number)];
    rates(a, c, rate);
    evaluations += 1;
    const [ra, rc] = [rate.a / a, rate.c / c];
    const fastest = Math.max(ra, rc);
    slope[0] = 1 / fastest;
    slope[1] = fastest > 0 ? ra / fastest : 0;
    slope[2] = fastest > 0 ? rc / fastest : 0;
  });
  const y = Float64Array.of(0, Math.log(start.a), Math.log(start.c));
  const states: SizeAt[] = [{ years: 0, a: start.a, c: start.c }];
  const done = (stop: GrowthRun['stop'], limit: string | null, distance: number): GrowthRun => ({
    stop,
    limit,
    states,
    distance,
    evaluations,
  });
  const events = [
    { key: '', margin: (state: Float64Array) => horizonYears - (state[0] as number) },
    ...limits.map(({ key, margin }) => ({
      key,
      margin: (state: Float64Array) =>
        margin(Math.exp(state[1] as number), Math.exp(state[2] as number)),
    })),
  ];
  let distance = 0;
  let h = Math.min(maxStep, 0.02);
  for (let n = 0; n < MOST_STEPS; n++) {
    stepper.step(y, h);
    const error = relativeError(y, stepper, tolerance);
    if (!(error <= 1) && h > SMALLEST_STEP) {
      h = Math.max(h * Math.max(0.9 * (error || Infinity) ** -0.2, 0.2), SMALLEST_STEP);
      continue;
    }
    if (!Number.isFinite(stepper.next[0] as number)) return done('no growth', null, distance);
    const event = firstEvent(stepper, y, h, events);
    if (event) stepper.step(y, event.h);
    distance += event ? event.h : h;
    y.set(stepper.next);
    states.push({
      years: y[0] as number,
      a: Math.exp(y[1] as number),
      c: Math.exp(y[2] as number),
    });
    if (event) return done(event.key ? 'limit' : 'horizon', event.key || null, distance);
    h = Math.min(maxStep, h * Math.min(5, 0.9 * Math.max(error, 1e-4) ** -0.2));
  }
  return done('step limit', null, distance);
}

function relativeError(y: Float64Array, { next, error }: Stepper, tolerance: number): number {
  const years = Math.abs(error[0] as number) / (tolerance * Math.abs(next[0] as number) + 1e-12);
  const depth = Math.abs(error[1] as number) / tolerance;
  const length = Math.abs(error[2] as number) / tolerance;
  return (y[0] as number) < 0 ? Infinity : Math.max(years, depth, length);
}

interface StateEvent {
  readonly key: string;
  readonly margin: (state: Float64Array) => number;
}

/** The earliest event inside the step, found by stepping again from its start with a shorter step. */
function firstEvent(
  stepper: Stepper,
  y: Float64Array,
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
    const length = root.status === 'no sign change' ? 0 : root.x;
    if (!first || length < first.h) first = { key, h: length };
  }
  return first;
}
