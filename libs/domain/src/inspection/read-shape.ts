import type { Face, FlawKind, LocationKind } from '../contract/vocabulary';
import { readDirection } from './read-direction';
import { readLigament } from './read-ligament';
import { readFace, readIndicationType, readKind, saysNothing } from './read-word';
import type { CandidateFinding, ImportAnswers, ImportContext } from './import-context';
import type { Size } from './read-size';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';
import { marginsOf } from './wall-margins';

type Shape = Pick<
  CandidateFinding,
  'kind' | 'face' | 'orientation' | 'indicationType' | 'ligamentMm'
>;

/** Wall between a tip and a surface that still counts as touching it [mm]; common practice. */
const TOUCHING = 2;

/** What the finding is: surface or embedded, to which face, in which direction, of which type. */
export function readShape(
  read: RowCells,
  answers: ImportAnswers,
  context: ImportContext,
  weld: LocationKind | undefined,
  size: Size | undefined,
  problems: ProblemList,
): Shape | undefined {
  checkScanSurface(read, context, problems);
  const indicationType = readType(read, answers, problems);
  const orientation = readDirection(read, answers, weld, problems);
  const side = readSide(read, problems);
  const stated = read.length('ligament')?.mm ?? null;
  const kind = readPosition(read, answers, side, stated, problems);
  if (!kind || !orientation) return undefined;
  const face = kind === 'embedded' ? nearerFace(context, size) : (side ?? answers.face);
  if (!face) {
    problems.add(
      'stop',
      'opensTo',
      read.text('opensTo'),
      'Does it open to the inside or the outside? Choose it above for the whole file, or enter it.',
    );
    return undefined;
  }
  if (kind === 'surface') checkSide(read, context, size, face, stated, problems);
  const ligamentMm = readLigament(read, context, size, kind, stated, problems);
  return { kind, face, orientation, indicationType, ligamentMm };
}

/** Depths are counted from the scan surface: a row seen from the other one would be assessed upside down. */
function checkScanSurface(read: RowCells, context: ImportContext, problems: ProblemList): void {
  const cell = read.text('scanSurface');
  if (saysNothing(cell)) return;
  const surface = readFace(cell);
  if (surface === context.scanSurface) return;
  problems.add(
    'stop',
    'scanSurface',
    cell,
    surface
      ? `The row was scanned from the ${surface}, the inspection says from the ${context.scanSurface}: depths would be counted from the wrong face. Correct the cell, or the scan surface of the inspection.`
      : `“${cell}” names no one scan surface. Depths are counted from it: enter inside (ID) or outside (OD).`,
  );
}

/** A word that is not known is told, and counts as crack-like; only an empty cell takes the answer for the file. */
function readType(read: RowCells, answers: ImportAnswers, problems: ProblemList) {
  const cell = read.text('indicationType');
  const known = readIndicationType(cell);
  if (!known && !saysNothing(cell) && !readKind(cell)) {
    problems.add(
      'check',
      'indicationType',
      cell,
      `“${cell}” names no known type: it is taken as unknown and counts as crack-like. Confirm, or enter the type.`,
    );
    return 'unknown';
  }
  const type = known ?? answers.indicationType ?? 'unknown';
  if (type === 'unknown') {
    problems.add(
      'note',
      'indicationType',
      cell,
      'The type is not known: it counts as crack-like until it is ruled out.',
    );
  }
  return type;
}

function readSide(read: RowCells, problems: ProblemList): Face | undefined {
  const cell = read.text('opensTo');
  const side = readFace(cell);
  if (!side && !saysNothing(cell)) {
    problems.add(
      'stop',
      'opensTo',
      cell,
      `“${cell}” names no side. Enter inside (ID) or outside (OD).`,
    );
  }
  return side;
}

function readPosition(
  read: RowCells,
  answers: ImportAnswers,
  side: Face | undefined,
  ligament: number | null,
  problems: ProblemList,
): FlawKind | undefined {
  const cell = read.text('positionType');
  const said = readKind(cell);
  if (!said && !saysNothing(cell)) {
    problems.add(
      'stop',
      'positionType',
      cell,
      `“${cell}” says neither surface nor embedded. Enter one of them; a flaw through the wall is not assessed from a file: report it at once.`,
    );
    return undefined;
  }
  const kind =
    said ??
    readKind(read.text('indicationType')) ??
    (side ? 'surface' : ligament !== null && ligament > 0 ? 'embedded' : answers.kind);
  if (!kind) {
    problems.add(
      'stop',
      'positionType',
      cell,
      'Surface or embedded? It is not given; choose it above for the whole file, or enter it.',
    );
    return undefined;
  }
  return kind;
}

const opposite = (face: Face): Face => (face === 'inside' ? 'outside' : 'inside');

function nearerFace(context: ImportContext, size: Size | undefined): Face {
  const metal = marginsOf(context, size);
  if (!metal) return 'inside';
  return metal.above <= metal.below ? context.scanSurface : opposite(context.scanSurface);
}

/** The stated side must agree with the depths. */
function checkSide(
  read: RowCells,
  context: ImportContext,
  size: Size | undefined,
  face: Face,
  ligament: number | null,
  problems: ProblemList,
): void {
  if (ligament !== null && ligament > TOUCHING) {
    problems.add(
      'hold',
      'ligament',
      read.text('ligament'),
      `It is called surface-breaking, but has ${ligament} mm to the surface. Confirm, or call it embedded.`,
    );
  }
  const metal = marginsOf(context, size);
  if (!metal) return;
  const gap = face === context.scanSurface ? metal.above : metal.below;
  if (gap > TOUCHING) {
    problems.add(
      'hold',
      'opensTo',
      read.text('opensTo'),
      `It is said to open to the ${face}, but by its depths ${Math.round(gap * 10) / 10} mm of metal lie between. Confirm, call it embedded, or correct depth or side.`,
    );
  }
}
