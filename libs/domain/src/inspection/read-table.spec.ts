import fc from 'fast-check';
import type { ImportAnswers, ImportContext } from './import-context';
import { readTable } from './read-table';
import { recogniseColumns } from './recognise-columns';

const CONTEXT: ImportContext = {
  tag: 'R-401',
  reportNo: 'BW-26-140',
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
    {
      id: '7b0f8c1e-0000-4000-8000-000000000002',
      name: 'C1',
      kind: 'circumferential weld',
      lengthMm: null,
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
  'position type',
  'orientation',
  'type',
  'scan surface',
  'report no',
];
const GOOD = [
  ...['R-401', 'L1', '1', '1250', '2380', '20.2', '7.6', '74', 'ID', '6', '', ''],
  ...['', '', '', 'OD', 'BW-26-140'],
];
const EMBEDDED = { 'opens to': '', 'position type': 'embedded', depth_to_top: '', height: '5' };

const HOSTILE = [
  'L1',
  'C1',
  'R-401',
  '<2',
  '1e9',
  '-5',
  '5',
  '12',
  '99',
  'ID',
  'OD',
  'embedded',
  '3:30',
  'NaN',
  '',
];

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
    ['a negative ligament', { ...EMBEDDED, ligament: '-5' }, ['stop ligament']],
    ['a ligament beyond the wall', { ...EMBEDDED, ligament: '100' }, ['stop ligament']],
    ['height and ligament of a whole wall', { ...EMBEDDED, ligament: '23' }, ['stop ligament']],
    ['no ligament', { ...EMBEDDED, ligament: '0' }, ['stop ligament']],
    ['a ligament to the farther surface', { ...EMBEDDED, ligament: '20' }, ['hold ligament']],
    [
      'a ligament against the depths',
      { ...EMBEDDED, depth_to_top: '3', ligament: '12' },
      ['hold ligament'],
    ],
    ['a ligament that agrees', { ...EMBEDDED, depth_to_top: '8', ligament: '8' }, []],
    ['the other scan surface', { 'scan surface': 'ID' }, ['stop scanSurface']],
    ['no one scan surface', { 'scan surface': 'both' }, ['stop scanSurface']],
    ['a direction it does not know', { orientation: '45 deg' }, ['stop orientation']],
    ['a type it does not know', { type: 'planar' }, ['check indicationType']],
    ['a flaw through the wall', { 'position type': 'through' }, ['stop positionType']],
    ['another report', { 'report no': 'BW-99-1' }, ['hold reportNo']],
    ['a length beyond the weld', { length: '90000' }, ['stop length']],
    ['a comma that may be decimal', { length: '1,250' }, ['hold length']],
    ['a clock with a point', { 'circ position': '3.30' }, ['hold circumferential']],
    ['a clock as part of a day', { 'circ position': '0.1458' }, ['hold circumferential']],
  ])('tells %s', (_what, change, problems) => {
    expect(told(change)).toEqual(problems);
  });

  it.each([
    ['L1', 'transverse', 'circumferential', []],
    ['L1', 'longitudinal', 'axial', []],
    ['C1', 'transverse', undefined, ['stop orientation']],
    ['C1', 'longitudinal', undefined, ['stop orientation']],
    ['C1', 'circ', 'circumferential', []],
    ['C1', 'axial', 'axial', []],
  ])('in %s, %s is %s', (weld, orientation, read, problems) => {
    expect(row({ weld, orientation })?.finding?.orientation).toBe(read);
    expect(told({ weld, orientation })).toEqual(problems);
  });

  it('takes an unknown word of type for crack-like, never for the answer of the file', () => {
    const cells = GOOD.map((cell, index) => (HEADERS[index] === 'type' ? 'planar' : cell));
    const answers = { ...ANSWERS, indicationType: 'slag' as const };
    const { rows } = readTable([{ row: 2, cells }], recogniseColumns(HEADERS), answers, CONTEXT);
    expect(rows[0]?.finding?.indicationType).toBe('unknown');
  });

  it('says which second column of a meaning is not read', () => {
    const { problems } = readTable(
      [],
      recogniseColumns(['weld', 'length', 'height', 'Höhe']),
      ANSWERS,
      CONTEXT,
    );
    expect(problems).toMatchObject([{ level: 'note', field: 'height' }]);
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
    const cell = fc.oneof(fc.string(), fc.constantFrom(...HOSTILE));
    fc.assert(
      fc.property(
        fc.array(cell, { minLength: HEADERS.length, maxLength: HEADERS.length }),
        (cells) => {
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
              finding.lengthMm > 0 &&
              (finding.kind === 'surface' ||
                ((finding.ligamentMm ?? 0) > 0 &&
                  finding.heightMm + (finding.ligamentMm ?? 0) < (finding.wallMm ?? 28))))
          );
        },
      ),
      { numRuns: 500 },
    );
  });
});
