import { decodeText } from './decode-text';
import { detectHeader } from './detect-header';
import { looksLikeDayClock, readClock } from './read-clock';
import { readDate } from './read-date';
import { readFace, readIndicationType, readKind, readOrientation } from './read-word';
import { recogniseColumns } from './recognise-columns';

const bytes = (...values: number[]) => Uint8Array.from(values);

describe('decodeText', () => {
  it('takes the byte-order mark off and says so', () => {
    expect(decodeText(bytes(0xef, 0xbb, 0xbf, 0x61))).toEqual({
      state: 'text',
      decoded: { text: 'a', encoding: 'UTF-8', mark: true },
    });
  });

  it('reads UTF-16 and Windows-1252', () => {
    expect(decodeText(bytes(0xff, 0xfe, 0x48, 0x00))).toMatchObject({
      decoded: { text: 'H', encoding: 'UTF-16' },
    });
    expect(decodeText(bytes(0x48, 0xf6, 0x68, 0x65))).toMatchObject({
      decoded: { text: 'Höhe', encoding: 'Windows-1252' },
    });
  });

  it.each([
    [bytes(0x50, 0x4b, 0x03, 0x04), 'spreadsheet workbook'],
    [bytes(0x1f, 0x8b, 1), 'gzip'],
    [bytes(0x4d, 0x5a, 1), 'program'],
    [bytes(0x25, 0x50, 0x44, 0x46), 'PDF'],
    [bytes(0x61, 0x00, 0x62), 'zero bytes'],
  ])('refuses what is no text by its name', (content, name) => {
    expect(decodeText(content)).toEqual({ state: 'refused', what: expect.stringContaining(name) });
  });
});

describe('recogniseColumns', () => {
  it('knows the trade’s words with their units, in any dress', () => {
    const fields = recogniseColumns([
      'height_mm',
      'Länge [mm]',
      'Axial (in)',
      'Uhr',
      'Naht',
      'depth_to_top_mm',
      'opens_to',
      'Height',
    ]);
    expect(fields.map(({ field, unit }) => [field, unit])).toEqual([
      ['height', 'mm'],
      ['length', 'mm'],
      ['axial', 'in'],
      ['circumferential', null],
      ['weld', null],
      ['depthToTop', 'mm'],
      ['opensTo', null],
      // a second column of the same meaning is left to the inspector
      [null, null],
    ]);
  });
});

describe('detectHeader', () => {
  it('finds the column names below a title', () => {
    expect(
      detectHeader([
        ['TOFD EXAMINATION - A-406'],
        [''],
        ['Ind', 'Weld', 'Height (in)', 'Length (in)'],
        ['1', 'L1', '0.2', '1.7'],
      ]),
    ).toBe(2);
  });
});

describe('readClock', () => {
  it('reads half hours with their resolution', () => {
    expect(readClock('3:30')).toEqual({ degrees: 105, resolutionDegrees: 7.5 });
    expect(readClock('12:00')).toEqual({ degrees: 0, resolutionDegrees: 7.5 });
    expect(readClock('3:31')).toMatchObject({ resolutionDegrees: 0.25 });
  });

  it('leaves alone what is no dial of twelve hours', () => {
    expect(readClock('15:30')).toBeUndefined();
    expect(looksLikeDayClock('15:30')).toBe(true);
    expect(readClock('half past 3')).toBeUndefined();
  });
});

describe('readDate', () => {
  it.each([
    ['2026-10-20', '2026-10-20'],
    ['10.11.2026', '2026-11-10'],
  ])('reads %s', (cell, date) => expect(readDate(cell)).toEqual({ state: 'date', date }));

  it.each(['10/11/26', '46337', '2026-13-10', '31.02.2026', 'soon'])(
    'does not guess %s',
    (cell) => {
      expect(readDate(cell).state).toBe('unreadable');
    },
  );
});

describe('words', () => {
  it('are read in more than one language', () => {
    expect([readFace('ID'), readFace('Innen'), readFace('OD/ID')]).toEqual([
      'inside',
      'inside',
      undefined,
    ]);
    expect([readKind('embedded'), readKind('LOF embedded'), readKind('surface')]).toEqual([
      'embedded',
      'embedded',
      'surface',
    ]);
    expect([readOrientation('circ'), readOrientation('axial'), readOrientation('')]).toEqual([
      'circumferential',
      'axial',
      undefined,
    ]);
    expect([
      readIndicationType('Riss'),
      readIndicationType('LOF'),
      readIndicationType('?'),
    ]).toEqual(['crack', 'lack of fusion', 'unknown']);
  });
});
