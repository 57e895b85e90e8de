import { logEach } from '../../numerics/exp-log';
import { MOST_DEPTH, MOST_HALF_LENGTH } from './flaw-bounds';
import type { FlawTable } from './flaw-table';
import {
  deep,
  ends,
  evaluations,
  flawAt,
  mostLnA,
  mostLnC,
  mostLnK,
  startN,
  startQ,
  startS,
  stepLength,
} from './lanes';
import type { LifeAccuracy } from './life-accuracy';
import { goTo } from './take-step';

const NO_BOUND = 1e300;
const logs = new Float64Array(6);

/** Puts a flaw of the table into a lane, at the start of its way. */
export function board(l: number, table: FlawTable, row: number, accuracy: LifeAccuracy): void {
  flawAt[l] = row;
  const t = table.thicknessMm[row] as number;
  const width = table.widthMm[row] as number;
  const wide = width === Infinity;
  logs[0] = t;
  logs[1] = table.depthMm[row] as number;
  logs[2] = table.halfLengthMm[row] as number;
  logs[3] = table.limitRangeMPaSqrtMm[row] as number;
  logs[4] = MOST_DEPTH * t;
  logs[5] = wide ? 1 : MOST_HALF_LENGTH * width;
  logEach(logs, 6);
  ends.thickness[l] = t;
  ends.lnThickness[l] = logs[0] as number;
  ends.inverseWidth[l] = wide ? 0 : 1 / width;
  ends.membrane[l] = table.membraneRangeMPa[row] as number;
  ends.bending[l] = table.bendingRangeMPa[row] as number;
  mostLnK[l] = logs[3] as number;
  mostLnA[l] = logs[4] as number;
  mostLnC[l] = wide ? NO_BOUND : (logs[5] as number);
  const lnA = logs[1] as number;
  const lnC = logs[2] as number;
  startS[l] = lnA + lnC;
  startQ[l] = lnA - lnC;
  startN[l] = 0;
  deep[l] = lnA > lnC ? 1 : 0;
  stepLength[l] = accuracy.firstStep;
  evaluations[l] = 0;
  goTo(l, lnA + lnC, lnA - lnC);
}
