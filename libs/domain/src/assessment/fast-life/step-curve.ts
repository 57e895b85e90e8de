import {
  curveN,
  curveQ,
  endN,
  endQ,
  slopeN,
  slopeQ,
  startN,
  startQ,
  stepLength,
  WIDTH,
} from './lanes';

// continuous extension of the pair of Dormand and Prince (Hairer, Nørsett and Wanner 1993, code dopri5)
const [D1, D3, D4, D5, D6, D7] = [
  -12715105075 / 11282082432,
  87487479700 / 32700410799,
  -10690763975 / 1880347072,
  701980252875 / 199316789632,
  -1453857185 / 822651844,
  69997945 / 29380423,
] as const;

/** Lays the curves of q and of the cycles through the step just taken. */
export function layCurves(l: number): void {
  curveQ[l] = lastCoefficient(slopeQ, l);
  curveN[l] = lastCoefficient(slopeN, l);
}

function lastCoefficient(slopes: Float64Array, l: number): number {
  const sum =
    D1 * (slopes[l] as number) +
    D3 * (slopes[2 * WIDTH + l] as number) +
    D4 * (slopes[3 * WIDTH + l] as number) +
    D5 * (slopes[4 * WIDTH + l] as number) +
    D6 * (slopes[5 * WIDTH + l] as number) +
    D7 * (slopes[6 * WIDTH + l] as number);
  return (stepLength[l] as number) * sum;
}

/** q and cycles at a share x of the step. */
export const qAt = (l: number, x: number): number =>
  curve(startQ[l] as number, endQ[l] as number, slopeQ, curveQ[l] as number, l, x);
export const nAt = (l: number, x: number): number =>
  curve(startN[l] as number, endN[l] as number, slopeN, curveN[l] as number, l, x);

function curve(from: number, to: number, slopes: Float64Array, last: number, l: number, x: number) {
  const h = stepLength[l] as number;
  const rise = to - from;
  const first = h * (slopes[l] as number) - rise;
  const second = rise - h * (slopes[6 * WIDTH + l] as number) - first;
  const rest = 1 - x;
  return from + x * (rise + rest * (first + x * (second + rest * last)));
}
