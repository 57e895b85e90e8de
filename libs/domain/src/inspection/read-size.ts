import type { CandidateFinding, ImportContext } from './import-context';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';
import { depthTolerance } from './wall-margins';

export type Size = Pick<
  CandidateFinding,
  | 'heightMm'
  | 'heightQualifier'
  | 'lengthMm'
  | 'lengthQualifier'
  | 'depthToTopMm'
  | 'wallMm'
  | 'amplitudeDb'
  | 'heightErrorMm'
  | 'lengthErrorMm'
>;

/** How large the finding is, checked against the wall and against itself. */
export function readSize(
  read: RowCells,
  context: ImportContext,
  problems: ProblemList,
): Size | undefined {
  const wall = read.length('wall')?.mm ?? null;
  const here = wall ?? context.wallMm;
  const top = read.length('depthToTop');
  const bottom = read.length('depthToBottom');
  const given = read.length('height');
  const length = read.length('length');
  if (wall !== null && Math.abs(wall - context.wallMm) > 0.125 * context.wallMm) {
    problems.add(
      'hold',
      'wall',
      read.text('wall'),
      `Wall ${wall} mm differs by more than 12.5 % from the register’s ${context.wallMm} mm. Confirm, or correct tag or unit.`,
    );
  }
  for (const [field, value] of [
    ['depthToTop', top],
    ['depthToBottom', bottom],
    ['height', given],
    ['length', length],
  ] as const) {
    if (value && value.mm < 0) {
      problems.add(
        'stop',
        field,
        read.text(field),
        'A depth or size cannot be negative: depths are counted from the scan surface. Are inside and outside mixed up?',
      );
    }
  }
  const height = given ?? heightBetween(top, bottom);
  if (top && bottom && bottom.mm < top.mm) {
    problems.add(
      'stop',
      'depthToBottom',
      read.text('depthToBottom'),
      `The lower tip (${bottom.mm} mm) lies above the upper one (${top.mm} mm).`,
    );
  }
  if (given && top && bottom && Math.abs(bottom.mm - top.mm - given.mm) > 0.5) {
    problems.add(
      'hold',
      'height',
      read.text('height'),
      `Height ${given.mm} mm does not agree with the depths ${top.mm} and ${bottom.mm} mm. The height is used; confirm or correct it.`,
    );
  }
  if (!height)
    problems.add(
      'stop',
      'height',
      read.text('height'),
      'No height is given. The height is the size that decides: enter it, or the technique’s largest possible miss.',
    );
  if (height && height.mm === 0)
    problems.add(
      'stop',
      'height',
      read.text('height'),
      'Height 0 mm is no size. Enter the measured height or its bound.',
    );
  if (height && height.mm >= here) {
    problems.add(
      'stop',
      'height',
      read.text('height'),
      `Height ${height.mm} mm is not less than the wall of ${here} mm. Is it inches, another component, or a percentage?`,
    );
  } else if (height && top && top.mm + height.mm > here + depthTolerance(here)) {
    problems.add(
      'hold',
      'depthToTop',
      read.text('depthToTop'),
      `Depth ${top.mm} and height ${height.mm} mm exceed the wall of ${here} mm by ${round(top.mm + height.mm - here)} mm; ${round(depthTolerance(here))} mm is allowed. Confirm or correct.`,
    );
  }
  if (!length || length.mm === 0)
    problems.add(
      'stop',
      'length',
      read.text('length'),
      'No length is given. Enter the measured length; the beam width is a bound.',
    );
  if (height && length && length.mm > 0 && length.mm < height.mm) {
    problems.add(
      'check',
      'length',
      read.text('length'),
      `Length ${length.mm} mm is less than height ${height.mm} mm: allowed, but unusual. Confirm that they are not swapped.`,
    );
  }
  for (const [field, value] of [
    ['height', height],
    ['length', length],
  ] as const) {
    if (value && value.qualifier !== '=') {
      problems.add(
        'hold',
        field,
        read.text(field),
        `“${read.text(field)}” is a bound, not a size: ${value.mm} mm is kept with its sign and assessed as the size. Confirm.`,
      );
    }
  }
  const errors = readErrors(read, context, problems);
  const amplitudeDb = readAmplitude(read, problems);
  if (!height || !length) return undefined;
  return {
    heightMm: height.mm,
    heightQualifier: height.qualifier,
    lengthMm: length.mm,
    lengthQualifier: length.qualifier,
    depthToTopMm: top?.mm ?? null,
    wallMm: wall,
    amplitudeDb,
    ...errors,
  };
}

type Length = ReturnType<RowCells['length']>;

function heightBetween(top: Length, bottom: Length): Length {
  return top && bottom ? { ...bottom, qualifier: '=', mm: round(bottom.mm - top.mm) } : undefined;
}

/** Widest errors used where the technique's are not stated: marked, and to be replaced. */
const UNSTATED = { heightErrorMm: 2, lengthErrorMm: 10 };

function readErrors(read: RowCells, context: ImportContext, problems: ProblemList) {
  const heightErrorMm = read.length('heightError')?.mm ?? context.heightErrorMm;
  const lengthErrorMm = read.length('lengthError')?.mm ?? context.lengthErrorMm;
  if (heightErrorMm === null || lengthErrorMm === null) {
    problems.add(
      'check',
      'heightError',
      '',
      `No sizing error is stated for this technique: ${UNSTATED.heightErrorMm} mm in height and ${UNSTATED.lengthErrorMm} mm in length are assumed. Confirm, or state it at the inspection.`,
    );
  }
  return {
    heightErrorMm: heightErrorMm ?? UNSTATED.heightErrorMm,
    lengthErrorMm: lengthErrorMm ?? UNSTATED.lengthErrorMm,
  };
}

function readAmplitude(read: RowCells, problems: ProblemList): number | null {
  const amplitude = read.number('amplitude');
  if (!amplitude) return null;
  if (Math.abs(amplitude.value) > 40) {
    problems.add(
      'hold',
      'amplitude',
      read.text('amplitude'),
      `${amplitude.value} is no echo height in dB against a reference. It is left out; confirm, or enter dB.`,
    );
    return null;
  }
  return amplitude.value;
}

const round = (value: number): number => Math.round(value * 100) / 100;
