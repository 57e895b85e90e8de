import { outOfBounds, type NumberRule, type Refusal } from '../../geometry/refusal';
import type { MapSubject } from './map-field';
import type { MapRequest } from './map-request';

type Row = readonly [min: number, max: number, unit: string, instead: string];

const LENGTH: Row = [1e-3, 1e5, 'mm', 'Give it in millimetres.'];
const STRESS: Row = [-2000, 2000, 'MPa', 'Give it in MPa (N/mm²).'];
const INTENSITY: Row = [
  -5e4,
  5e4,
  'MPa·√mm',
  'Give it in MPa·√mm: 31.6 times the value in MPa·√m.',
];
const RATIO: Row = [-10, 10, '', 'Divide the one stress by the other.'];
const EDGE: Row = [-1e6, 1e6, 'mm', 'Give it in millimetres.'];

/** What each number of a subject may be. A crack that is pressed shut has no such field. */
const ROWS: Readonly<Record<string, Row>> = {
  halfLengthMm: LENGTH,
  radiusMm: LENGTH,
  halfWidthMm: LENGTH,
  halfHeightMm: LENGTH,
  stressMPa: STRESS,
  alongMPa: STRESS,
  ratio: RATIO,
  angleDegrees: [-360, 360, '°', 'Give it in degrees.'],
  pressureMPa: [0, 200, 'MPa', 'Give it in MPa; a value in bar is ten times too large.'],
  opening: [0, 5e4, INTENSITY[2], INTENSITY[3]],
  sliding: INTENSITY,
};

const ruleOf = (input: string, value: number, [min, max, unit, instead]: Row): NumberRule => ({
  input,
  name: input,
  unit,
  value,
  min,
  max,
  instead,
});

function subjectRules(subject: MapSubject): readonly NumberRule[] {
  const rules = Object.entries(subject).flatMap(([key, value]) => {
    const row = ROWS[key];
    return row ? [ruleOf(`subject.${key}`, Number(value), row)] : [];
  });
  const open = ruleOf('subject.stressMPa', 0, [0, 2000, 'MPa', 'A closed crack has no tip field.']);
  return subject.kind === 'crack' ? [...rules, { ...open, value: subject.stressMPa }] : rules;
}

/** Every number of a request that is impossible, and every array that does not fit its grid. */
export function mapRefusals(request: MapRequest): readonly Refusal[] {
  const { grid, subject, component, cap, poisson, values, mask } = request;
  const cells = grid.columns * grid.rows;
  const numbers = outOfBounds([
    ...subjectRules(subject),
    ruleOf('grid.leftMm', grid.leftMm, EDGE),
    ruleOf('grid.bottomMm', grid.bottomMm, EDGE),
    { ...ruleOf('grid.rightMm', grid.rightMm, EDGE), min: grid.leftMm, above: true },
    { ...ruleOf('grid.topMm', grid.topMm, EDGE), min: grid.bottomMm, above: true },
    ruleOf('grid.columns', grid.columns, [2, 4096, '', 'Ask for at most 4096 columns.']),
    ruleOf('grid.rows', grid.rows, [2, 4096, '', 'Ask for at most 4096 rows.']),
    { ...ruleOf('cap', cap, [0, 1e6, '', 'Give the largest value to draw.']), above: true },
    ruleOf('poisson', poisson, [0, 0.5, '', 'Steel has about 0.3.']),
    ruleOf('values.length', values.length, [cells, cells, '', 'Give one place for each point.']),
    ruleOf('mask.length', mask.length, [cells, cells, '', 'Give one place for each point.']),
  ]);
  const whole = Number.isInteger(grid.columns) && Number.isInteger(grid.rows);
  const comparable = component !== 'near-tip share' || subject.kind === 'crack';
  return [
    ...numbers,
    ...(whole ? [] : [WHOLE]),
    ...(comparable ? [] : [{ ...SHARE, value: subject.kind }]),
  ];
}

const WHOLE: Refusal = {
  input: 'grid.columns',
  limit: 'whole numbers of columns and rows',
  value: null,
  message: 'A grid has whole numbers of columns and rows.',
  instead: 'Round them.',
};

const SHARE: Refusal = {
  input: 'component',
  limit: 'a crack',
  value: null,
  message: 'The near-tip field is compared with the exact field of a crack.',
  instead: 'Ask for another component, or map a crack.',
};
