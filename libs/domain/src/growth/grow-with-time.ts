import { dormandPrince, type Stepper } from '../numerics/dormand-prince';
import { firstEvent, sizeIn, type RatesAt, type StateEvent } from './growth-walk';
import type { Rates } from './growth-rates';
import type { GrowthLimit, GrowthOptions, GrowthRun, SizeAt } from './integrate-growth';

const HORIZON = 'horizon';
const SMALLEST_STEP = 1e-7;
const MOST_STEPS = 50_000;

/**
 * Follows depth and half length under rates that change with time, as where a wall thins: a flaw that stands
 * still may begin to grow later, and a limit may be reached while it stands. The step variable is therefore
 * the way in the logarithm of the sizes and the share of the horizon together, which never stops.
 */
export function growWithTime(
  start: { readonly a: number; readonly c: number },
  rates: RatesAt,
  limits: readonly GrowthLimit[],
  { horizonYears, tolerance = 1e-6, maxStep = 0.05 }: GrowthOptions,
): GrowthRun {
  let evaluations = 0;
  const slopes = slopesOf(rates, horizonYears);
  const stepper = dormandPrince(3, (y, slope) => {
    evaluations += 1;
    slopes(y, slope);
  });
  const events = eventsOf(limits, horizonYears);
  const y = Float64Array.of(0, Math.log(start.a), Math.log(start.c));
  const states: SizeAt[] = [{ years: 0, ...start }];
  const done = (stop: GrowthRun['stop'], limit: string | null = null): GrowthRun => {
    const { a, c } = sizeIn(y);
    const distance = Math.max(Math.log(a / start.a), Math.log(c / start.c));
    return { stop, limit, states, distance, evaluations };
  };
  const already = events.find(({ margin }) => margin(y) <= 0);
  if (already) return done('limit', already.key);
  let h = maxStep / 5;
  for (let n = 0; n < MOST_STEPS; n++) {
    stepper.step(y, h);
    const error = errorOf(stepper, horizonYears) / tolerance;
    if (!(error <= 1) && h > SMALLEST_STEP) {
      h = Math.max(
        h * (Number.isFinite(error) ? Math.max(0.9 * error ** -0.2, 0.2) : 0.2),
        SMALLEST_STEP,
      );
      continue;
    }
    const event = firstEvent(stepper, y, h, events);
    if (event) stepper.step(y, event.h);
    y.set(stepper.next);
    states.push(sizeIn(y));
    if (event && event.key !== HORIZON) return done('limit', event.key);
    if (event) return done(moved(states) ? 'horizon' : 'no growth');
    h = Math.min(maxStep, h * Math.min(5, 0.9 * Math.max(error, 1e-4) ** -0.2));
  }
  return done('step limit');
}

/** Error of the last step: of the time against the horizon, of the sizes in the logarithm. */
const errorOf = ({ error: [years = 0, depth = 0, length = 0] }: Stepper, horizonYears: number) =>
  Math.max(Math.abs(years) / horizonYears, Math.abs(depth), Math.abs(length));

function slopesOf(rates: RatesAt, horizonYears: number) {
  const rate: Rates = { a: 0, c: 0 };
  return (y: Float64Array, slope: Float64Array): void => {
    const { years, a, c } = sizeIn(y);
    rates(a, c, rate, years);
    const ra = rate.a / a;
    const rc = rate.c / c;
    const pace = Math.max(Math.abs(ra), Math.abs(rc)) + 1 / horizonYears;
    slope[0] = 1 / pace;
    slope[1] = ra / pace;
    slope[2] = rc / pace;
  };
}

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

// sizes go through the logarithm: a flaw that stands still differs by rounding alone
const ROUNDING = 1e-12;

function moved(states: readonly SizeAt[]): boolean {
  const [first, last] = [states[0], states[states.length - 1]];
  if (!first || !last) return false;
  return (
    Math.abs(Math.log(last.a / first.a)) > ROUNDING ||
    Math.abs(Math.log(last.c / first.c)) > ROUNDING
  );
}
