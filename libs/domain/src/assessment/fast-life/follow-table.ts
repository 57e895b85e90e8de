import { exp } from '../../numerics/exp-log';
import { board } from './board';
import { rowStands } from './flaw-bounds';
import type { FlawTable } from './flaw-table';
import { evaluations, flawAt, NO_FLAW, startN, startQ, startS, WIDTH } from './lanes';
import type { LawPieces } from './law-pieces';
import type { LifeAccuracy } from './life-accuracy';
import { stopCode } from './life-stops';
import type { LifeTable } from './life-table';
import { GOING, setOut, settle } from './settle';
import { weighSteps } from './step-error';
import { takeStep } from './take-step';

const REFUSED = stopCode('refused');

/**
 * Follows every flaw of the table to its end. All lanes step together, each by its own length; a flaw that is done
 * makes room for the next one.
 */
export function followTable(
  table: FlawTable,
  law: LawPieces,
  accuracy: LifeAccuracy,
  lives: LifeTable,
): void {
  const rows = table.thicknessMm.length;
  let next = 0;
  let used = 0;
  for (; used < WIDTH && next < rows; used++) next = fill(used, next, table, law, accuracy, lives);
  let going = used;
  while (going > 0) {
    takeStep(used);
    weighSteps(used, accuracy);
    going = 0;
    for (let l = 0; l < used; l++) {
      if (flawAt[l] === NO_FLAW) continue;
      const stop = settle(l, law, accuracy);
      if (stop !== GOING) {
        note(l, stop, lives);
        next = fill(l, next, table, law, accuracy, lives);
      }
      if (flawAt[l] !== NO_FLAW) going++;
    }
  }
}

/** Boards the next flaw that has a way to go; answers the row after it. */
function fill(
  l: number,
  next: number,
  table: FlawTable,
  law: LawPieces,
  accuracy: LifeAccuracy,
  lives: LifeTable,
): number {
  for (let row = next; row < table.thicknessMm.length; row++) {
    if (!rowStands(table, row)) {
      lives.stop[row] = REFUSED;
      continue;
    }
    board(l, table, row, accuracy);
    const stop = setOut(l, law, accuracy);
    if (stop === GOING) return row + 1;
    note(l, stop, lives);
  }
  flawAt[l] = NO_FLAW;
  return table.thicknessMm.length;
}

function note(l: number, stop: number, lives: LifeTable): void {
  const row = flawAt[l] as number;
  const s = startS[l] as number;
  const q = startQ[l] as number;
  lives.cycles[row] = startN[l] as number;
  lives.depthMm[row] = exp((s + q) / 2);
  lives.halfLengthMm[row] = exp((s - q) / 2);
  lives.stop[row] = stop;
  lives.evaluations[row] = evaluations[l] as number;
}
