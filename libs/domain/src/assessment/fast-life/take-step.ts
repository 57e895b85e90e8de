import { evaluate } from './evaluate';
import { endQ, lnAspect, lnDepth, slopeQ, startQ, startS, stepLength, WIDTH } from './lanes';

/** Weights of the fifth order solution of Dormand and Prince 1980, stages 1 to 6. */
export const WEIGHTS = [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84] as const;
const [B1, , B3, B4, B5, B6] = WEIGHTS;

// rows of the tableau, each on its own so that the loops below hold numbers only
const [A31, A32] = [3 / 40, 9 / 40] as const;
const [A41, A42, A43] = [44 / 45, -56 / 15, 32 / 9] as const;
const [A51, A52, A53, A54] = [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729] as const;
const [A61, A62, A63, A64, A65] = [
  9017 / 3168,
  -355 / 33,
  46732 / 5247,
  49 / 176,
  -5103 / 18656,
] as const;

/** Puts a lane where it is evaluated next. */
export function goTo(l: number, s: number, q: number): void {
  lnDepth[l] = 0.5 * (s + q);
  lnAspect[l] = q;
}

/**
 * One step of the first `used` lanes, each of its own length, stage by stage; the slopes at its start are known.
 * Only q enters the slopes; the cycles are a sum afterwards.
 */
export function takeStep(used: number): void {
  for (let l = 0; l < used; l++) to(l, 1 / 5, k(0, l) / 5);
  evaluate(0, used, 1);
  for (let l = 0; l < used; l++) to(l, 3 / 10, A31 * k(0, l) + A32 * k(1, l));
  evaluate(0, used, 2);
  for (let l = 0; l < used; l++) to(l, 4 / 5, A41 * k(0, l) + A42 * k(1, l) + A43 * k(2, l));
  evaluate(0, used, 3);
  for (let l = 0; l < used; l++) {
    to(l, 8 / 9, A51 * k(0, l) + A52 * k(1, l) + A53 * k(2, l) + A54 * k(3, l));
  }
  evaluate(0, used, 4);
  for (let l = 0; l < used; l++) {
    to(l, 1, A61 * k(0, l) + A62 * k(1, l) + A63 * k(2, l) + A64 * k(3, l) + A65 * k(4, l));
  }
  evaluate(0, used, 5);
  for (let l = 0; l < used; l++) {
    to(l, 1, B1 * k(0, l) + B3 * k(2, l) + B4 * k(3, l) + B5 * k(4, l) + B6 * k(5, l));
  }
  for (let l = 0; l < used; l++) endQ[l] = lnAspect[l] as number;
  evaluate(0, used, 6);
}

/** Slope of q at a stage. */
const k = (stage: number, l: number) => slopeQ[stage * WIDTH + l] as number;

/** Puts a lane at a share of its step, by a slope over it. */
function to(l: number, share: number, slope: number): void {
  const h = stepLength[l] as number;
  goTo(l, (startS[l] as number) + share * h, (startQ[l] as number) + h * slope);
}
