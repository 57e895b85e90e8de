import { type CheckResult, evaluateRow } from '@ligament/domain/verification/check-row';
import { CHECK_ROWS } from '@ligament/domain/verification/checks';
import { concatMap, from, map, type Observable, scan, timer } from 'rxjs';

/** The groups of checks in the order of the computation. */
export const GROUPS: readonly string[] = [...new Set(CHECK_ROWS.map(({ group }) => group))];

/** All results so far, one group more at each turn, so that the page stays alive meanwhile. */
export const evaluateInTurns = (): Observable<readonly CheckResult[]> =>
  from(GROUPS).pipe(
    concatMap((group) => timer(0).pipe(map(() => evaluateGroup(group)))),
    scan((done: readonly CheckResult[], more) => [...done, ...more], []),
  );

const evaluateGroup = (group: string): readonly CheckResult[] =>
  CHECK_ROWS.filter((row) => row.group === group).map(evaluateRow);

/** One group in figures. */
export interface GroupSummary {
  readonly group: string;
  readonly values: number;
  readonly met: number;
  /** How much of its tolerance the worst value uses. */
  readonly worst: number;
}

export function summarise(results: readonly CheckResult[]): readonly GroupSummary[] {
  return GROUPS.map((group) => {
    const rows = results.filter((row) => row.group === group);
    return {
      group,
      values: rows.length,
      met: rows.filter(({ met }) => met).length,
      worst: rows.reduce((most, row) => Math.max(most, shareOf(row)), 0),
    };
  }).filter(({ values }) => values > 0);
}

// a tolerance of nothing is for counts that must be exact
const shareOf = ({ deviation, tolerance }: CheckResult): number =>
  tolerance > 0 ? Math.abs(deviation) / tolerance : deviation === 0 ? 0 : Infinity;
