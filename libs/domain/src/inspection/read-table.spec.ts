import fc from 'fast-check';
import type { ImportAnswers, ImportContext } from './import-context';
import { readTable } from './read-table';
import { recogniseColumns } from './recognise-columns';

const CONTEXT: ImportContext = {
  tag: 'R-401',
  wallMm: 28,
  insideDiameterMm: 2600,
  locations: [
    {
      id: '7b0f8c1e-0000-4000-8000-000000000001',
      name: 'L1',
      kind: 'longitudinal weld',
      lengthMm: 6200,
      circumferenceOn: 'outside',
    },
  ],
  inspectedOn: '2026-11-10',
  today: '2026-12-01',
  scanSurface: 'outside',
  heightErrorMm: 0.7,
  lengthErrorMm: 3,
};

const ANSWERS: ImportAnswers = {
  lengthUnit: 'mm',
  decimalMark: '.',
  positionIs: 'centre',
  kind: null,
  face: null,
  orientation: 'axial',
  indicationType: null,
};

const HEADERS = [
  'component_tag',
  'weld',
  'ind',
  'axial',
  'circ position',
  'depth_to_top',
  'height',
  'length',
  'opens to',
  'amplitude',
  'wall',
  'ligament',
];
const GOOD = ['R-401', 'L1', '1', '1250', '2380', '20.2', '7.6', '74', 'ID', '6', '', ''];

const row = (change: Readonly<Record<string, string>>) => {
  const cells = GOOD.map((cell, index) => change[HEADERS[index] ?? ''] ?? cell);
  const { rows } = readTable([{ row: 2, cells }], recogniseColumns(HEADERS), ANSWERS, CONTEXT);
  return rows[0];
};
const told = (change: Readonly<Record<string, string>>) =>
  row(change)
    ?.problems.filter(({ level }) => level !== 'note')
    .map(({ level, field }) => `${level} ${field}`);

describe('readTable', () => {
  it('takes a good row as it is', () => {
    expect(told({})).toEqual([]);
    expect(row({})?.finding).toMatchObject({
      heightMm: 7.6,
      lengthMm: 74,
      kind: 'surface',
      face: 'inside',
      axialMm: 1250,
    });
  });

  it.each([
    ['a negative depth', { depth_to_top: '-1.0' }, ['stop depthToTop', 'hold opensTo']],
    ['a height above the wall', { height: '31' }, ['stop height']],
    ['depth and height beyond the wall', { depth_to_top: '26', height: '4' }, ['hold depthToTop']],
    ['a side against its depth', { depth_to_top: '10', height: '4' }, ['hold opensTo']],
    ['a length below the height', { length: '6' }, ['check length']],
    ['no length', { length: '0' }, ['stop length']],
    ['no height', { height: 'N/A' }, ['stop height']],
    ['a bound', { height: '<2', depth_to_top: '26.5' }, ['hold height']],
    ['an echo in percent', { amplitude: '140' }, ['hold amplitude']],
    ['a place more than once around', { 'circ position': '99999' }, ['stop circumferential']],
    ['a clock of a day', { 'circ position': '15:30' }, ['hold circumferential']],
    ['a clock in words', { 'circ position': 'half past 3' }, ['stop circumferential']],
    ['a place off the weld', { axial: '7000' }, ['hold axial']],
    ['a weld it does not have', { weld: 'L9' }, ['stop weld']],
    ['another component', { component_tag: 'R-104' }, ['stop componentTag']],
    ['a tag in another dress', { component_tag: 'r 401' }, ['check componentTag']],
    ['two sides', { 'opens to': 'OD/ID' }, ['stop opensTo', 'stop positionType']],
    ['surface with metal before it', { ligament: '5' }, ['hold ligament']],
    ['another wall', { wall: '35' }, ['hold wall', 'hold opensTo']],
    ['inches in a cell', { height: '0.3in' }, []],
  ])('tells %s', (_what, change, problems) => {
    expect(told(change)).toEqual(problems);
  });

  it('leaves out blank lines, footers and repeats, and stops a number used twice', () => {
    const lines = [
      { row: 2, cells: GOOD },
      { row: 3, cells: GOOD },
      { row: 4, cells: ['', '', ''] },
      { row: 5, cells: ['Total 2'] },
      { row: 6, cells: GOOD.map((cell) => (cell === '7.6' ? '7.0' : cell)) },
    ];
    const { rows } = readTable(lines, recogniseColumns(HEADERS), ANSWERS, CONTEXT);
    expect(rows.map(({ finding }) => finding !== null)).toEqual([true, false, false, false, false]);
    expect(rows[4]?.problems.at(-1)).toMatchObject({ level: 'stop', field: 'indicationNo' });
  });

  it('says which columns are missing', () => {
    const { problems } = readTable([], recogniseColumns(['weld']), ANSWERS, CONTEXT);
    expect(problems.map(({ field }) => field)).toEqual(['length', 'height']);
  });

  it('never throws, and never lets an impossible finding through, whatever the cells hold', () => {
    const cell = fc.oneof(
      fc.string(),
      fc.constantFrom('L1', 'R-401', '<2', '1e9', '-5', '99', 'ID', 'embedded', '3:30', 'NaN'),
    );
    fc.assert(
      fc.property(fc.array(cell, { minLength: 12, maxLength: 12 }), (cells) => {
        const { rows } = readTable(
          [{ row: 2, cells }],
          recogniseColumns(HEADERS),
          ANSWERS,
          CONTEXT,
        );
        const finding = rows[0]?.finding;
        return (
          !finding ||
          (finding.heightMm > 0 &&
            finding.heightMm < (finding.wallMm ?? 28) &&
            finding.lengthMm > 0)
        );
      }),
      { numRuns: 500 },
    );
  });
});
