import { differenceRows, valueText } from './difference-rows';
import { fieldLabel } from './field-label';

describe('differences between two states of a record', () => {
  it('name what changed, with unit, before and after', () => {
    const rows = differenceRows({ wallMm: 35, tag: 'R-401' }, { wallMm: 34.2, tag: 'R-401' });
    expect(rows).toEqual([{ label: 'Wall', unit: 'mm', before: '35', after: '34.2' }]);
  });

  it('reach into nested records', () => {
    const rows = differenceRows(
      { heightAllowanceMmByTechnique: { PAUT: 1, TOFD: 0.8 } },
      { heightAllowanceMmByTechnique: { PAUT: 1.2, TOFD: 0.8 } },
    );
    expect(rows).toEqual([
      { label: 'Height allowance, PAUT', unit: 'mm', before: '1', after: '1.2' },
    ]);
  });

  it('show a new record without a state before, and a removed one without a state after', () => {
    expect(differenceRows(null, { name: 'Wren' })).toEqual([
      { label: 'Name', unit: '', before: null, after: 'Wren' },
    ]);
    expect(differenceRows({ name: 'Wren' }, null)[0]).toMatchObject({
      before: 'Wren',
      after: null,
    });
  });

  it('show what was not there as a dash', () => {
    expect(differenceRows({ requiredWallMm: null }, { requiredWallMm: 12 })[0]).toMatchObject({
      before: '—',
      after: '12',
    });
  });
});

describe('a field name as words', () => {
  it.each([
    ['insideDiameterMm', 'Inside diameter', 'mm'],
    ['operatingTemperatureC', 'Operating temperature', '°C'],
    ['toughnessMpaSqrtM', 'Toughness', 'MPa√m'],
    ['countPerYear', 'Count', 'per year'],
    ['commissionedOn', 'Commissioned', ''],
    ['materialId', 'Material', ''],
    ['dueSoonDays', 'Due soon within', 'days'],
    ['post-weld heat treated', 'post-weld heat treated', ''],
  ])('%s is %s [%s]', (name, label, unit) => {
    expect(fieldLabel([name])).toEqual({ label, unit });
  });
});

describe('a value as words', () => {
  it.each([
    [true, 'yes'],
    ['2026-11-10', '10 Nov 2026'],
    ['2026-11-10T14:05:00.000Z', '10 Nov 2026, 14:05'],
    [[180, 90], '180, 90'],
    [4.8e-18, '4.8e−18'],
    [-2.5, '−2.5'],
    ['', '—'],
    ['7d444840-9dc0-4fa2-a4c1-5b2d7c4b8a11', 'record 7d444840'],
  ])('%s is %s', (value, text) => {
    expect(valueText(value)).toBe(text);
  });
});
