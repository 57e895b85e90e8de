/** Right-hand side of dy/ds = f(y) for a state of fixed length; writes into `slope`. */
export type Derivative = (y: Float64Array, slope: Float64Array) => void;

/** One step of the pair 5(4) of Dormand and Prince, with room of its own so that no step allocates. */
export interface Stepper {
  /** Steps from y by h into `next`, and writes the estimate of the local error into `error`. */
  readonly step: (y: Float64Array, h: number) => void;
  readonly next: Float64Array;
  readonly error: Float64Array;
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

/** A stepper for states of the given length. */
export function dormandPrince(length: number, f: Derivative): Stepper {
  const slopes = DIFFERENCE.map(() => new Float64Array(length));
  const trial = new Float64Array(length);
  const next = new Float64Array(length);
  const error = new Float64Array(length);
  const slopeAt = (stage: number) => slopes[stage] as Float64Array;
  const step = (y: Float64Array, h: number) => {
    f(y, slopeAt(0));
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
    for (let i = 0; i < length; i++) {
      let sum = 0;
      for (let k = 0; k < DIFFERENCE.length; k++) {
        sum += (DIFFERENCE[k] as number) * (slopeAt(k)[i] as number);
      }
      error[i] = h * sum;
    }
  };
  return { step, next, error };
}
