import type { LifeDrawing } from './life-drawing';
import { lifeGeometry } from './life-geometry';

const drawing = (over: Partial<LifeDrawing> = {}): LifeDrawing => ({
  wallMm: 28,
  quantity: 'depth',
  measured: [
    { on: '2022-11-10', heightMm: 5.9, errorMm: 0.7, label: 'T-4' },
    { on: '2026-11-10', heightMm: 7.6, errorMm: 0.7, label: 'T-5' },
  ],
  predicted: [
    { on: '2026-11-10', heightMm: 8.6 },
    { on: '2028-11-10', heightMm: 9.7 },
  ],
  limitMm: 9.7,
  limit: { on: '2028-11-10', label: 'limiting' },
  due: { on: '2027-11-10', label: 'inspect by', basis: 'half of the life' },
  windows: [{ startsOn: '2027-09-06', endsOn: '2027-10-12', label: 'TA-27' }],
  events: [],
  today: '2026-12-01',
  ...over,
});

describe('lifeGeometry', () => {
  it('sets equal times equally far apart', () => {
    const { measured, limit, due } = lifeGeometry(drawing(), 1000);
    const [first, second] = measured.map(({ x }) => x);
    const perYear = ((second ?? 0) - (first ?? 0)) / 4;
    expect(due?.x).toBeCloseTo((second ?? 0) + perYear, 0);
    expect(limit?.x).toBeCloseTo((second ?? 0) + 2 * perYear, 0);
  });

  it('draws the error bar of a finding to the scale of the depth', () => {
    const { measured, bottom, limitY } = lifeGeometry(drawing(), 1000);
    const last = measured[1];
    const perMm = (bottom - (limitY ?? 0)) / 9.7;
    expect((last?.low ?? 0) - (last?.high ?? 0)).toBeCloseTo(1.4 * perMm, 6);
    expect(bottom - (last?.y ?? 0)).toBeCloseTo(7.6 * perMm, 6);
  });

  it('keeps the next years readable when the limit is far away', () => {
    const { goesOn, limit } = lifeGeometry(
      drawing({ limit: { on: '2060-01-01', label: 'limiting' } }),
      1000,
    );
    expect(goesOn).toBe(true);
    expect(limit).toBeNull();
  });

  it('names a window only where its name covers no other', () => {
    const windows = [
      { startsOn: '2027-09-06', endsOn: '2027-10-12', label: 'TA-27' },
      { startsOn: '2027-10-20', endsOn: '2027-10-28', label: 'SS-27' },
      { startsOn: '2035-01-01', endsOn: '2035-02-01', label: 'TA-35' },
    ];
    expect(lifeGeometry(drawing({ windows }), 1000).windows.map(({ named }) => named)).toEqual([
      true,
      false,
    ]);
  });

  it('stands without a single finding', () => {
    const shape = lifeGeometry(
      drawing({ measured: [], predicted: [], limit: null, limitMm: null, due: null }),
      400,
    );
    expect(shape.measured).toEqual([]);
    expect(shape.limitY).toBeNull();
    expect(Number.isFinite(shape.today?.x)).toBe(true);
  });

  it('turns a label at the right end to the left', () => {
    const { limit } = lifeGeometry(
      drawing({ limit: { on: '2028-11-10', label: 'a rather long label, 10 Nov 2028' } }),
      500,
    );
    expect(limit?.flip).toBe(true);
  });
});
