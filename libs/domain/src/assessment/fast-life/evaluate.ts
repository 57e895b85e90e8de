import { plateSurfaceEnds } from '../../fracture/stress-intensity/plate-surface-ends';
import { expEach } from '../../numerics/exp-log';
import {
  ends,
  lnAspect,
  lnCDeepest,
  lnCEnd,
  lnDepth,
  lnKDeepest,
  lnKEnd,
  mDeepest,
  mEnd,
  slopeN,
  slopeQ,
  WIDTH,
} from './lanes';

const rates = new Float64Array(2 * WIDTH);

/** K of the lanes from `from` to `to` where they stand, and the slopes there as those of a stage. */
export function evaluate(from: number, to: number, stage: number): void {
  plateSurfaceEnds(ends, from, to);
  takeSlopes(from, to, stage);
}

/**
 * Slopes by the K that is known. With ra = d ln a/dN and rc = d ln c/dN the way is s = ln a + ln c: ds/dN =
 * ra + rc never stops while anything grows, at whichever point of the front.
 */
export function takeSlopes(from: number, to: number, stage: number): void {
  const count = to - from;
  for (let l = from, j = 0; j < count; l++, j++) {
    const lnA = lnDepth[l] as number;
    const lnC = lnA - (lnAspect[l] as number);
    rates[j] =
      (lnCDeepest[l] as number) + (mDeepest[l] as number) * (lnKDeepest[l] as number) - lnA;
    rates[count + j] = (lnCEnd[l] as number) + (mEnd[l] as number) * (lnKEnd[l] as number) - lnC;
  }
  expEach(rates, 2 * count);
  for (let l = from, j = 0; j < count; l++, j++) {
    const ra = rates[j] as number;
    const rc = rates[count + j] as number;
    const cycles = 1 / (ra + rc);
    slopeN[stage * WIDTH + l] = cycles;
    slopeQ[stage * WIDTH + l] = (ra - rc) * cycles;
  }
}
