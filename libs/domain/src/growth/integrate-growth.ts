import {
  firstEvent,
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
 * Follows depth and half length together, each by its own rate, until a limit is reached. Steps are chosen
 * by their estimated error; the end of the last one is found by stepping again onto the limit.
 */
export function integrateGrowth(
  start: { readonly a: number; readonly c: number },
  rates: RatesAt,
  limits: readonly GrowthLimit[],
  { horizonYears, tolerance = 1e-5, maxStep = 0.1 }: GrowthOptions,
): GrowthRun {
  let evaluations = 0;
  const stepper = growthStepper(rates, () => (evaluations += 1));
  const events = eventsOf(limits, horizonYears);
  const y = Float64Array.of(0, Math.log(start.a), Math.log(start.c));
  const states: SizeAt[] = [{ years: 0, a: start.a, c: start.c }];
  let distance = 0;
  const done = (stop: GrowthRun['stop'], limit: string | null = null): GrowthRun => ({
    stop,
    limit,
    states,
    distance,
    evaluations,
  });
  let h = Math.min(maxStep, 0.02);
  for (let n = 0; n < MOST_STEPS; n++) {
    stepper.step(y, h);
    const error = stepError(stepper, tolerance);
    if (!(error <= 1) && h > SMALLEST_STEP) {
      h = Math.max(h * shrink(error), SMALLEST_STEP);
      continue;
    }
    if (!Number.isFinite(stepper.next[0] as number)) {
      // nothing grows any more: the flaw stands as it is to the horizon
      states.push({ ...sizeIn(y), years: horizonYears });
      return done('no growth');
    }
    const event = firstEvent(stepper, y, h, events);
    if (event) stepper.step(y, event.h);
    distance += event ? event.h : h;
    y.set(stepper.next);
    states.push(sizeIn(y));
    if (event) return event.key === HORIZON ? done('horizon') : done('limit', event.key);
    h = Math.min(maxStep, h * Math.min(5, 0.9 * Math.max(error, 1e-4) ** -0.2));
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
