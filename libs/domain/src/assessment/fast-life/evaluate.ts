import { plateSurfaceEnds } from '../../fracture/stress-intensity/plate-surface-ends';
import { exp } from '../../numerics/exp-log';
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
  for (let l = from; l < to; l++) {
    const lnA = lnDepth[l] as number;
    const lnC = lnA - (lnAspect[l] as number);
    const ra = exp(
      (lnCDeepest[l] as number) + (mDeepest[l] as number) * (lnKDeepest[l] as number) - lnA,
    );
    const rc = exp((lnCEnd[l] as number) + (mEnd[l] as number) * (lnKEnd[l] as number) - lnC);
    const cycles = 1 / (ra + rc);
    slopeN[stage * WIDTH + l] = cycles;
    slopeQ[stage * WIDTH + l] = (ra - rc) * cycles;
  }
}
