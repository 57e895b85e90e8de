import { refused, type Refused } from '../../geometry/refusal';
import type { GrowthLaw } from '../../growth/growth-law';
import { flawRefusals, rowStands } from './flaw-bounds';
import { flawTable, putFlaw, type FatigueFlaw } from './flaw-table';
import { followTable } from './follow-table';
import { lawPieces } from './law-pieces';
import { STANDARD, type LifeAccuracy } from './life-accuracy';
import { LIFE_STOPS, type LifeStop } from './life-stops';
import { lifeTable } from './life-table';

/** The life of one flaw: cycles until it stops, why, and its size there. */
export interface FatigueLife {
  readonly status: 'followed';
  readonly cycles: number;
  readonly stop: LifeStop;
  readonly depthMm: number;
  readonly halfLengthMm: number;
  /** How often K was evaluated at both points. */
  readonly evaluations: number;
}

const one = flawTable(1);
const answer = lifeTable(1);

/** Life of one surface flaw in a plate under cycles, the same to the last bit as in a table of many. */
export function surfaceFlawLife(
  flaw: FatigueFlaw,
  law: GrowthLaw,
  accuracy: LifeAccuracy = STANDARD,
): FatigueLife | Refused {
  putFlaw(one, 0, flaw);
  if (!rowStands(one, 0)) return refused(...flawRefusals(flaw));
  followTable(one, lawPieces(law), accuracy, answer);
  return {
    status: 'followed',
    cycles: answer.cycles[0] as number,
    stop: LIFE_STOPS[answer.stop[0] as number] ?? 'unresolved',
    depthMm: answer.depthMm[0] as number,
    halfLengthMm: answer.halfLengthMm[0] as number,
    evaluations: answer.evaluations[0] as number,
  };
}
