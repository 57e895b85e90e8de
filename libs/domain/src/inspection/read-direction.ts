import type { LocationKind, Orientation } from '../contract/vocabulary';
import type { ImportAnswers } from './import-context';
import { isWeldRelative, readOrientation, saysNothing } from './read-word';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';

/** Places where a direction along or across means the same by the weld and by the vessel's axis. */
const ALIKE: readonly LocationKind[] = ['longitudinal weld', 'plain zone'];

/**
 * Direction of the flaw on the vessel. “Transverse” and “longitudinal” are said of the weld (common practice), so that
 * outside a longitudinal weld they may mean either: the inspector then says which. Only an empty cell takes the answer
 * given for the file.
 */
export function readDirection(
  read: RowCells,
  answers: ImportAnswers,
  weld: LocationKind | undefined,
  problems: ProblemList,
): Orientation | undefined {
  const cell = read.text('orientation');
  const stop = (message: string) => problems.add('stop', 'orientation', cell, message);
  if (saysNothing(cell)) {
    if (!answers.orientation)
      stop(
        'Axial or circumferential? The direction is not given; choose it above for the whole file, or enter it.',
      );
    return answers.orientation ?? undefined;
  }
  const said = readOrientation(cell);
  if (!said) {
    stop(
      `“${cell}” is no direction known here. Enter axial or circumferential; for an oblique flaw the more severe one.`,
    );
    return undefined;
  }
  if (weld && isWeldRelative(cell) && !ALIKE.includes(weld)) {
    stop(
      `“${cell}” may be meant by the weld or by the vessel, and this is a ${weld}. Enter axial (along the vessel) or circumferential (around it).`,
    );
    return undefined;
  }
  return said;
}
