/** Right-hand side of dy/ds = f(y) for a state of fixed length; writes into `slope`. */
export type Derivative = (y: Float64Array, slope: Float64Array) => void;

/** One step of the pair 5(4) of Dormand and Prince, with room of its own so that no step allocates. */
export interface Stepper {
  /** Takes the slope at y, where the next steps start. */
  readonly start: (y: Float64Array) => void;
  /**
   * Steps from y by h into `next`, and writes the estimate of the local error into `error`. Where the slope at y
   * is known, from `start` or `keep`, six evaluations are enough.
   */
  readonly step: (y: Float64Array, h: number, startKnown?: boolean) => void;
  /** The end of the step becomes the start of the next: its slope is the last stage already. */
  readonly keep: () => void;
  /** The state at a share of the step just taken, of fourth order, without an evaluation. */
  readonly between: (y: Float64Array, h: number, share: number, into: Float64Array) => void;
  readonly next: Float64Array;
  readonly error: Float64Array;
  /** Slopes at the start and at the end of the step. */
  readonly first: Float64Array;
  readonly last: Float64Array;
}

// tableau of Dormand and Prince 1980: rows of the stages, then fifth order minus fourth
const STAGES = [
  [1 / 5],
  [3 / 40, 9 / 40],
  [44 / 45, -56 / 15, 32 / 9],
  [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
  [9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
  [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84],
] as const;
const DIFFERENCE = [71 / 57600, 0, -71 / 16695, 71 / 1920, -17253 / 339200, 22 / 525, -1 / 40];
// continuous extension, Hairer, Nørsett and Wanner 1993 (their code dopri5)
const CURVE = [
  -12715105075 / 11282082432,
  0,
  87487479700 / 32700410799,
  -10690763975 / 1880347072,
  701980252875 / 199316789632,
  -1453857185 / 822651844,
  69997945 / 29380423,
];

/** A stepper for states of the given length. */
export function dormandPrince(length: number, f: Derivative): Stepper {
  const slopes = DIFFERENCE.map(() => new Float64Array(length));
  const trial = new Float64Array(length);
  const next = new Float64Array(length);
  const error = new Float64Array(length);
  const slopeAt = (stage: number) => slopes[stage] as Float64Array;
  const [first, last] = [slopeAt(0), slopeAt(DIFFERENCE.length - 1)];
  const start = (y: Float64Array) => f(y, first);
  const keep = () => first.set(last);
  const step = (y: Float64Array, h: number, startKnown = false) => {
    if (!startKnown) start(y);
    for (let stage = 0; stage < STAGES.length; stage++) {
      const weights = STAGES[stage] as readonly number[];
      const target = stage === STAGES.length - 1 ? next : trial;
      for (let i = 0; i < length; i++) {
        let sum = 0;
        for (let k = 0; k < weights.length; k++) {
          sum += (weights[k] as number) * (slopeAt(k)[i] as number);
        }
        target[i] = (y[i] as number) + h * sum;
      }
      f(target, slopeAt(stage + 1));
    }
    for (let i = 0; i < length; i++) error[i] = h * weighted(DIFFERENCE, slopes, i);
  };
  const between = (y: Float64Array, h: number, share: number, into: Float64Array) => {
    for (let i = 0; i < length; i++) {
      const from = y[i] as number;
      const rise = (next[i] as number) - from;
      const bend = h * (first[i] as number) - rise;
      const turn = rise - h * (last[i] as number) - bend;
      const curve = turn + (1 - share) * h * weighted(CURVE, slopes, i);
      into[i] = from + share * (rise + (1 - share) * (bend + share * curve));
    }
  };
  return { start, step, keep, between, next, error, first, last };
}

function weighted(weights: readonly number[], slopes: readonly Float64Array[], i: number): number {
  let sum = 0;
  for (let k = 0; k < weights.length; k++) {
    sum += (weights[k] as number) * ((slopes[k] as Float64Array)[i] as number);
  }
  return sum;
}
