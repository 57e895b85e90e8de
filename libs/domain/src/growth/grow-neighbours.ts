import { outOfBounds, refused, type Refused } from '../geometry/refusal';
import { dormandPrince } from '../numerics/dormand-prince';
import { firstEvent, type StateEvent } from './growth-walk';
import type { Rates } from './growth-rates';
import { joined, joiningMargin, type InteractionRule, type NeighbourFlaw } from './neighbours';

/** Rates of one flaw by its own K [mm/year]. */
export type FlawRates = (a: number, c: number, into: Rates) => void;

/** Two flaws that grow side by side in one plane. */
export interface NeighbourPair {
  readonly flaws: readonly [NeighbourFlaw, NeighbourFlaw];
  readonly rates: readonly [FlawRates, FlawRates];
  readonly centreDistanceMm: number;
  readonly rule: InteractionRule;
}

/** Whether two flaws join within a time, and what they are then. */
export interface NeighbourGrowth {
  readonly status: 'joined' | 'apart' | 'step limit';
  readonly years: number;
  readonly flaws: readonly [NeighbourFlaw, NeighbourFlaw];
  /** The one flaw they become; null while apart. */
  readonly joined: NeighbourFlaw | null;
}

const TOLERANCE = 1e-8;
const MOST_STEPS = 20_000;
const LARGEST_MM = 1e5;

/** Follows two flaws in time until they join by the rule or the horizon is reached. */
export function growNeighbours(
  pair: NeighbourPair,
  horizonYears: number,
): NeighbourGrowth | Refused {
  const broken = outOfBounds(rulesOf(pair, horizonYears));
  if (broken.length > 0) return refused(...broken);
  const [one, other] = pair.flaws;
  const y = Float64Array.of(0, ...[one.a, one.c, other.a, other.c].map(Math.log));
  const stepper = dormandPrince(5, slopesOf(pair));
  const events = [joiningOf(pair)];
  if (joiningOf(pair).margin(y) <= 0) return answer(pair, y, 'joined');
  let h = horizonYears / 100;
  for (let n = 0; n < MOST_STEPS; n++) {
    h = Math.min(h, horizonYears - (y[0] as number));
    stepper.step(y, h);
    const error = Math.max(...stepper.error.map(Math.abs)) / TOLERANCE;
    // too long a step, or one that ran beyond any size
    if (!(error <= 1)) {
      h *= Number.isFinite(error) ? Math.max(0.9 * error ** -0.2, 0.2) : 0.2;
      continue;
    }
    const event = firstEvent(stepper, y, h, events);
    if (event) stepper.step(y, event.h);
    y.set(stepper.next);
    if (event) return answer(pair, y, 'joined');
    if (horizonYears - (y[0] as number) <= 1e-12 * horizonYears) return answer(pair, y, 'apart');
    h *= Math.min(5, 0.9 * Math.max(error, 1e-4) ** -0.2);
  }
  return answer(pair, y, 'step limit');
}

/** Slopes of the years and of the logarithms of the four sizes. */
function slopesOf({ rates: [one, other] }: NeighbourPair) {
  const rate: Rates = { a: 0, c: 0 };
  return (y: Float64Array, slope: Float64Array): void => {
    slope[0] = 1;
    for (const [at, rates] of [
      [1, one],
      [3, other],
    ] as const) {
      const a = Math.exp(y[at] as number);
      const c = Math.exp(y[at + 1] as number);
      rates(a, c, rate);
      slope[at] = rate.a / a;
      slope[at + 1] = rate.c / c;
    }
  };
}

function flawsIn(y: Float64Array): readonly [NeighbourFlaw, NeighbourFlaw] {
  const size = (i: number) => Math.exp(y[i] as number);
  return [
    { a: size(1), c: size(2) },
    { a: size(3), c: size(4) },
  ];
}

const joiningOf = ({ centreDistanceMm, rule }: NeighbourPair): StateEvent => ({
  key: 'joining',
  margin: (state) => joiningMargin(...flawsIn(state), centreDistanceMm, rule),
});

function answer(
  { centreDistanceMm }: NeighbourPair,
  y: Float64Array,
  status: NeighbourGrowth['status'],
): NeighbourGrowth {
  const flaws = flawsIn(y);
  return {
    status,
    years: y[0] as number,
    flaws,
    joined: status === 'joined' ? joined(...flaws, centreDistanceMm) : null,
  };
}

function rulesOf({ flaws, centreDistanceMm }: NeighbourPair, horizonYears: number) {
  const length = (input: string, name: string, value: number) => ({
    input,
    name,
    unit: 'mm',
    value,
    min: 0,
    max: LARGEST_MM,
    above: true,
    instead: 'Give the sizes and the distance of the middles in millimetres.',
  });
  return [
    ...flaws.flatMap(({ a, c }, i) => [
      length(`flaws.${i}.a`, `Depth of flaw ${i + 1}`, a),
      length(`flaws.${i}.c`, `Half length of flaw ${i + 1}`, c),
    ]),
    length('centreDistanceMm', 'Distance of the middles', centreDistanceMm),
    {
      input: 'horizonYears',
      name: 'Time to follow',
      unit: 'years',
      value: horizonYears,
      min: 0,
      max: 1000,
      above: true,
      instead: 'Give the time in years.',
    },
  ];
}
