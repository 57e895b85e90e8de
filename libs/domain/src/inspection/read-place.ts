import type { CandidateFinding, ImportAnswers, ImportContext } from './import-context';
import { looksLikeDayClock, readClock } from './read-clock';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';

type Place = Pick<
  CandidateFinding,
  'locationId' | 'locationName' | 'axialMm' | 'circumferentialMm'
>;

/** Where the finding lies: the weld, along it, and around the shell. */
export function readPlace(
  read: RowCells,
  answers: ImportAnswers,
  context: ImportContext,
  problems: ProblemList,
): Place | undefined {
  const weld = read.text('weld');
  const location = context.locations.find(({ name }) => plain(name) === plain(weld));
  const known = context.locations.map(({ name }) => name).join(', ') || 'none yet';
  if (!location) {
    const words = weld
      ? `${context.tag} has no weld or place “${weld}”; it has ${known}. Correct the cell, or add it in the register.`
      : `No weld or place is given. ${context.tag} has ${known}.`;
    problems.add('stop', 'weld', weld, words);
  }
  const axial = read.length('axial');
  const along = read.length('length');
  const centre =
    axial && answers.positionIs === 'start' ? axial.mm + (along?.mm ?? 0) / 2 : axial?.mm;
  if (location?.lengthMm && centre !== undefined && (centre < 0 || centre > location.lengthMm)) {
    problems.add(
      'hold',
      'axial',
      read.text('axial'),
      `${Math.round(centre)} mm lies outside weld ${location.name}, which is ${location.lengthMm} mm long. Check datum and unit, then confirm or correct.`,
    );
  }
  if (location && along) checkLength(read, along.mm, location, context, problems);
  const around = readAround(read, location?.circumferenceOn ?? 'outside', context, problems);
  return location
    ? {
        locationId: location.id,
        locationName: location.name,
        axialMm: centre ?? null,
        circumferentialMm: around ?? null,
      }
    : undefined;
}

/** A flaw cannot be longer than its weld, or than once around. */
function checkLength(
  read: RowCells,
  lengthMm: number,
  location: ImportContext['locations'][number],
  context: ImportContext,
  problems: ProblemList,
): void {
  const round = Math.PI * (context.insideDiameterMm + 2 * context.wallMm);
  const longest = location.lengthMm ?? (location.kind === 'circumferential weld' ? round : null);
  if (longest === null || lengthMm <= longest) return;
  problems.add(
    'stop',
    'length',
    read.text('length'),
    `${Math.round(lengthMm)} mm is longer than ${location.name}, which is ${Math.round(longest)} mm long. Check decimal mark and unit.`,
  );
}

/** Distance around the shell in millimetres, from millimetres or a clock position. */
function readAround(
  read: RowCells,
  measuredOn: 'inside' | 'outside',
  context: ImportContext,
  problems: ProblemList,
): number | undefined {
  const cell = read.text('circumferential');
  const diameter = context.insideDiameterMm + (measuredOn === 'outside' ? 2 * context.wallMm : 0);
  const round = Math.PI * diameter;
  const clock = readClock(cell);
  if (clock) {
    const resolution = Math.round((round * clock.resolutionDegrees) / 360);
    problems.add(
      'check',
      'circumferential',
      cell,
      `Clock position: ${cell} is ${clock.degrees}°, read to ± ${resolution} mm on this diameter. Confirm that the clock is read in the register’s viewing direction.`,
    );
    return Math.round((round * clock.degrees) / 360);
  }
  if (looksLikeDayClock(cell)) {
    problems.add(
      'hold',
      'circumferential',
      cell,
      `“${cell}” is no position on a clock of twelve hours. Enter h:mm from 0:00 to 12:00, or millimetres.`,
    );
    return undefined;
  }
  if (/[a-z]{3}/i.test(cell) && !/mm|inch/i.test(cell) && !/^(n\/?a|none|nil)$/i.test(cell)) {
    problems.add(
      'stop',
      'circumferential',
      cell,
      `“${cell}” cannot be read as a position. Enter h:mm or millimetres.`,
    );
    return undefined;
  }
  const distance = read.length('circumferential');
  if (distance && !distance.unit && mayBeDial(read, distance.value)) {
    problems.add(
      'hold',
      'circumferential',
      cell,
      `“${cell}” may be a clock position, an angle or a part of a day; it is read as ${distance.mm} mm around. Confirm millimetres, or enter h:mm.`,
    );
  }
  if (distance && (distance.mm > round * 1.001 || distance.mm < -round)) {
    problems.add(
      'stop',
      'circumferential',
      cell,
      `${Math.round(distance.mm)} mm is more than once around: the circumference is ${Math.round(round)} mm on the ${measuredOn}.`,
    );
    return undefined;
  }
  return distance?.mm;
}

/** Whether a bare number stands where a clock or an angle may be meant: `3.30`, `0.1458`, or under such a heading. */
function mayBeDial(read: RowCells, value: number): boolean {
  if (/clock|uhr|angle|winkel|deg|°|grad/i.test(read.header('circumferential'))) return true;
  const bare = read.headerUnit('circumferential') === null && value > 0;
  return bare && (value < 1 || /^\d{1,2}[.,][0-5]\d$/.test(read.text('circumferential')));
}

const plain = (name: string): string => name.replaceAll(/[\s\-_.]/g, '').toUpperCase();
