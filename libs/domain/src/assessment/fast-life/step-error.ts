import type { LifeAccuracy } from './life-accuracy';
import { gain, slopeN, slopeQ, startN, stepError, stepLength, WIDTH } from './lanes';
import { WEIGHTS } from './take-step';

const [B1, , B3, B4, B5, B6] = WEIGHTS;

// fifth order minus fourth, Dormand and Prince 1980
const [E1, E3, E4, E5, E6, E7] = [
  71 / 57600,
  -71 / 16695,
  71 / 1920,
  -17253 / 339200,
  22 / 525,
  -1 / 40,
] as const;

/** Way in which the rates change so much that what is still to come counts no further. */
const AHEAD = 0.5;

/**
 * Cycles and errors of the step of the first `used` lanes, the error as a multiple of what is allowed, between
 * 1e-4 and 1e6. A wrong a/c spoils only what is still to come, so its error counts by the share of the life ahead.
 */
export function weighSteps(used: number, { aspect, cycles }: LifeAccuracy): void {
  for (let l = 0; l < used; l++) {
    const h = stepLength[l] as number;
    const n1 = slopeN[l] as number;
    const n3 = slopeN[2 * WIDTH + l] as number;
    const n4 = slopeN[3 * WIDTH + l] as number;
    const n5 = slopeN[4 * WIDTH + l] as number;
    const n6 = slopeN[5 * WIDTH + l] as number;
    const n7 = slopeN[6 * WIDTH + l] as number;
    const cyclesGone = h * (B1 * n1 + B3 * n3 + B4 * n4 + B5 * n5 + B6 * n6);
    const wrong = h * (E1 * n1 + E3 * n3 + E4 * n4 + E5 * n5 + E6 * n6 + E7 * n7);
    const total = (startN[l] as number) + cyclesGone;
    const ahead = AHEAD * n7;
    const inCycles = Math.abs(wrong) / (cycles * total);
    const inAspect = (Math.abs(errorInAspect(l, h)) * ahead) / (aspect * (total + ahead));
    const error = Math.max(inCycles, inAspect, 1e-4);
    gain[l] = cyclesGone;
    // no number at all means a stage fell where nothing grows
    stepError[l] = error < 1e6 ? error : 1e6;
  }
}

function errorInAspect(l: number, h: number): number {
  return (
    h *
    (E1 * (slopeQ[l] as number) +
      E3 * (slopeQ[2 * WIDTH + l] as number) +
      E4 * (slopeQ[3 * WIDTH + l] as number) +
      E5 * (slopeQ[4 * WIDTH + l] as number) +
      E6 * (slopeQ[5 * WIDTH + l] as number) +
      E7 * (slopeQ[6 * WIDTH + l] as number))
  );
}
