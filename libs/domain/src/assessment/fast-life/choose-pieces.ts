import { takeSlopes } from './evaluate';
import * as lanes from './lanes';
import { pieceOf, type LawPieces } from './law-pieces';

/** Chooses the pieces of the law by K where a flaw starts, and takes its slopes again by them. */
export function choosePieces(l: number, law: LawPieces): void {
  lanes.pieceDeepest[l] = pieceOf(law, lanes.ends.lnKDeepest[l] as number);
  lanes.pieceEnd[l] = pieceOf(law, lanes.ends.lnKEnd[l] as number);
  takePieces(l, law);
  takeSlopes(l, l + 1, 0);
}

/** Puts the chosen pieces in force in a lane. */
export function takePieces(l: number, { lnC, m, low, high }: LawPieces): void {
  const deepest = lanes.pieceDeepest[l] as number;
  const end = lanes.pieceEnd[l] as number;
  lanes.lnCDeepest[l] = lnC[deepest] as number;
  lanes.mDeepest[l] = m[deepest] as number;
  lanes.lowDeepest[l] = low[deepest] as number;
  lanes.highDeepest[l] = high[deepest] as number;
  lanes.lnCEnd[l] = lnC[end] as number;
  lanes.mEnd[l] = m[end] as number;
  lanes.lowEnd[l] = low[end] as number;
  lanes.highEnd[l] = high[end] as number;
}
