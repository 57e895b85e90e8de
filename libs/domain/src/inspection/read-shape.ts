import type { Face } from '../contract/vocabulary';
import type { CandidateFinding, ImportAnswers, ImportContext } from './import-context';
import { readFace, readIndicationType, readKind, readOrientation } from './read-word';
import type { Size } from './read-size';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';

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
  size: Size | undefined,
  problems: ProblemList,
): Shape | undefined {
  const indicationType =
    readIndicationType(read.text('indicationType')) ?? answers.indicationType ?? 'unknown';
  if (indicationType === 'unknown') {
    problems.add(
      'note',
      'indicationType',
      read.text('indicationType'),
      'The type is not known: it counts as crack-like until it is ruled out.',
    );
  }
  const orientation = readOrientation(read.text('orientation')) ?? answers.orientation;
  if (!orientation)
    problems.add(
      'stop',
      'orientation',
      read.text('orientation'),
      'Axial or circumferential? The direction is not given; choose it above for the whole file, or enter it.',
    );
  const opensTo = read.text('opensTo');
  const side = readFace(opensTo);
  if (opensTo && !side && !isNoSide(opensTo)) {
    problems.add(
      'stop',
      'opensTo',
      opensTo,
      `“${opensTo}” names no side. Enter inside (ID) or outside (OD).`,
    );
  }
  const ligament = read.length('ligament')?.mm ?? null;
  const kind =
    readKind(read.text('positionType')) ??
    readKind(read.text('indicationType')) ??
    (side ? 'surface' : ligament !== null && ligament > 0 ? 'embedded' : answers.kind);
  if (!kind)
    problems.add(
      'stop',
      'positionType',
      read.text('positionType'),
      'Surface or embedded? It is not given; choose it above for the whole file, or enter it.',
    );
  if (!kind || !orientation) return undefined;
  const face = kind === 'surface' ? (side ?? answers.face) : nearerFace(context, size);
  if (!face) {
    problems.add(
      'stop',
      'opensTo',
      opensTo,
      'Does it open to the inside or the outside? Choose it above for the whole file, or enter it.',
    );
    return undefined;
  }
  checkSide(read, context, size, kind, face, ligament, problems);
  const ligamentMm = kind === 'embedded' ? (ligament ?? ligamentBySize(context, size)) : null;
  if (kind === 'embedded' && !ligamentMm) {
    problems.add(
      'hold',
      'ligament',
      read.text('ligament'),
      'An embedded flaw needs its ligament to the nearer surface, above 0 mm. Enter it, or call the flaw surface-breaking.',
    );
  }
  return { kind, face, orientation, indicationType, ligamentMm };
}

const isNoSide = (cell: string): boolean => /^(|-|n\/?a|none|no)$/i.test(cell.trim());

const opposite = (face: Face): Face => (face === 'inside' ? 'outside' : 'inside');

/** Metal above the upper tip and below the lower one, seen from the scan surface. */
function margins(context: ImportContext, size: Size | undefined) {
  if (!size || size.depthToTopMm === null) return undefined;
  const wall = size.wallMm ?? context.wallMm;
  return { above: size.depthToTopMm, below: wall - size.depthToTopMm - size.heightMm };
}

function nearerFace(context: ImportContext, size: Size | undefined): Face {
  const metal = margins(context, size);
  if (!metal) return 'inside';
  return metal.above <= metal.below ? context.scanSurface : opposite(context.scanSurface);
}

function ligamentBySize(context: ImportContext, size: Size | undefined): number | null {
  const metal = margins(context, size);
  return metal ? Math.round(Math.max(0, Math.min(metal.above, metal.below)) * 100) / 100 : null;
}

/** The stated side must agree with the depths. */
function checkSide(
  read: RowCells,
  context: ImportContext,
  size: Size | undefined,
  kind: 'surface' | 'embedded',
  face: Face,
  ligament: number | null,
  problems: ProblemList,
): void {
  if (kind === 'surface' && ligament !== null && ligament > TOUCHING) {
    problems.add(
      'hold',
      'ligament',
      read.text('ligament'),
      `It is called surface-breaking, but has ${ligament} mm to the surface. Confirm, or call it embedded.`,
    );
  }
  const metal = margins(context, size);
  if (kind !== 'surface' || !metal) return;
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
