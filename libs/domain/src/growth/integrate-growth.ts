import { growthTrail } from './growth-trail';
import {
  firstEventOnCurve,
  growthStepper,
  sizeIn,
  stepError,
  type RatesAt,
  type StateEvent,
} from './growth-walk';

/** Something that ends or interrupts growth: its margin is above 0 before and reaches 0 at the event. */
export interface GrowthLimit {
  readonly key: string;
  readonly margin: (a: number, c: number, years: number) => number;
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
  /** Longest step in ln a + ln c. */
  readonly maxStep?: number;
  /** States wanted, evenly along the way by the curves through the steps; those at the steps when not given. */
  readonly states?: number;
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

/** Longest stretch of the way in which no limit is looked at. */
const UNWATCHED = 0.25;
/** Share of a step from which on an event counts as at its end; a step to an event goes a little beyond it. */
const NEAR_END = 0.999;
const BEYOND = 1.0001;
/** A way to an event so short that no better curve is wanted. */
const SHORTEST_AGAIN = 1e-9;
const FIRST_STEP = 0.4;
const SMALLEST_STEP = 1e-5;
const MOST_STEPS = 20_000;

/**
 * Follows depth and half length together, each by its own rate, until a limit is reached. Steps are chosen by
 * their estimated error; the end is found on the curve through the last one.
 */
export function integrateGrowth(
  start: { readonly a: number; readonly c: number },
  rates: RatesAt,
  limits: readonly GrowthLimit[],
  { horizonYears, tolerance = 5e-6, maxStep = 0.5, states }: GrowthOptions,
): GrowthRun {
  let evaluations = 0;
  const stepper = growthStepper(rates, () => (evaluations += 1));
  const events = eventsOf(limits, horizonYears);
  const y = Float64Array.of(0, Math.log(start.a), Math.log(start.c));
  const trail = growthTrail(start, states);
  const done = (stop: GrowthRun['stop'], limit: string | null = null): GrowthRun => ({
    stop,
    limit,
    ...trail.end(),
    evaluations,
  });
  const watch = (h: number) =>
    firstEventOnCurve(stepper, y, h, events, Math.max(1, Math.ceil(h / UNWATCHED)));
  stepper.start(y);
  let h = Math.min(maxStep, FIRST_STEP);
  for (let n = 0; n < MOST_STEPS; n++) {
    stepper.step(y, h, true);
    const error = stepError(stepper, tolerance);
    if (!(error <= 1) && h > SMALLEST_STEP) {
      h = Math.max(h * shrink(error), SMALLEST_STEP);
      continue;
    }
    if (!Number.isFinite(stepper.next[0] as number)) {
      // nothing grows any more: the flaw stands as it is to the horizon
      trail.rest(horizonYears);
      return done('no growth');
    }
    let event = watch(h);
    if (event && event.share < NEAR_END && event.share * h > SHORTEST_AGAIN) {
      // the curve is best near the end of a step: once more, to just beyond the event
      h *= event.share * BEYOND;
      stepper.step(y, h, true);
      event = watch(h);
    }
    trail.take(stepper, y, h, event?.share ?? 1);
    if (event) return event.key === HORIZON ? done('horizon') : done('limit', event.key);
    y.set(stepper.next);
    stepper.keep();
    h = Math.min(maxStep, h * Math.min(4, 0.9 * Math.max(error, 1e-4) ** -0.2));
  }
  return done('step limit');
}

const HORIZON = 'horizon';

const eventsOf = (limits: readonly GrowthLimit[], horizonYears: number): StateEvent[] => [
  { key: HORIZON, margin: (state) => horizonYears - (state[0] as number) },
  ...limits.map(({ key, margin }) => ({
    key,
    margin: (state: Float64Array) => {
      const { a, c, years } = sizeIn(state);
      return margin(a, c, years);
    },
  })),
];

// an error that is no number means the step ran into a place without growth
const shrink = (error: number) =>
  Number.isFinite(error) ? Math.max(0.9 * error ** -0.2, 0.2) : 0.2;
