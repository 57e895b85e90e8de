import fc from 'fast-check';
import { toMPaSqrtM } from '../../units/convert';
import { governingTemperature, type LoadCase } from './governing-temperature';
import { toughnessFromTable, type TablePoint, type ToughnessTable } from './toughness-table';

const tableOf = (value: readonly TablePoint[]): ToughnessTable => ({
  value,
  provenance: 'measured',
  note: 'test report 7',
});
const TABLE = tableOf([
  { temperatureC: -50, kMPaSqrtM: 60 },
  { temperatureC: -20, kMPaSqrtM: 90 },
  { temperatureC: 0, kMPaSqrtM: 130 },
  { temperatureC: 40, kMPaSqrtM: 180 },
]);
const at = (temperatureC: number, table = TABLE): number => {
  const result = toughnessFromTable(table, temperatureC);
  return result.status === 'found' ? toMPaSqrtM(result.kMatMPaSqrtMm) : Number.NaN;
};

describe('toughness against temperature', () => {
  it('goes through its points in any order, rising where they rise', () => {
    const turned = tableOf([...TABLE.value].reverse());
    for (const { temperatureC, kMPaSqrtM } of TABLE.value) {
      expect(at(temperatureC)).toBeCloseTo(kMPaSqrtM, 9);
      expect(at(temperatureC, turned)).toBeCloseTo(kMPaSqrtM, 9);
    }
    fc.assert(
      fc.property(fc.double({ min: -50, max: 35, noNaN: true }), (t) => {
        expect(at(t + 5)).toBeGreaterThan(at(t));
      }),
    );
  });

  it('is one value where the table has one point, at that temperature only', () => {
    const single = tableOf([{ temperatureC: -20, kMPaSqrtM: 90 }]);
    expect(at(-20, single)).toBeCloseTo(90, 12);
    expect(at(-19, single)).toBeNaN();
  });

  it.each([-50.1, 41, 300])('is not extrapolated to %d °C, naming the limit', (temperature) => {
    expect(toughnessFromTable(TABLE, temperature)).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'temperatureC', limit: 'from -50 to 40 °C', value: temperature }],
    });
  });

  it('refuses an empty table, a temperature given twice and a number that is none', () => {
    expect(toughnessFromTable(tableOf([]), 0)).toMatchObject({ refusals: [{ value: 0 }] });
    const twice = tableOf([...TABLE.value, { temperatureC: 0, kMPaSqrtM: 120 }]);
    expect(toughnessFromTable(twice, 0)).toMatchObject({
      refusals: [{ input: 'table', value: 0 }],
    });
    const wrong = tableOf([{ temperatureC: 0, kMPaSqrtM: 4000 }]);
    expect(toughnessFromTable(wrong, 0)).toMatchObject({
      refusals: [{ input: 'table.0.kMPaSqrtM' }],
    });
  });
});

describe('the temperature that governs', () => {
  const cases: readonly LoadCase[] = [
    { name: 'operation', temperatureC: 40, stressFactor: 1 },
    { name: 'start-up', temperatureC: -20, stressFactor: 0.4 },
    { name: 'hydrotest', temperatureC: 0, stressFactor: 1.4 },
  ];
  const ofTable = (temperature: number) => toughnessFromTable(TABLE, temperature);

  it('is the one of least toughness for its stress', () => {
    const answer = governingTemperature(cases, ofTable);
    if (answer.status === 'refused') throw new Error('refused');
    expect(answer.cases.map(({ toughness }) => toMPaSqrtM(toughness.kMatMPaSqrtMm))).toEqual([
      expect.closeTo(180, 9),
      expect.closeTo(90, 9),
      expect.closeTo(130, 9),
    ]);
    expect(answer.governing.loadCase.name).toBe('hydrotest');
    expect(toMPaSqrtM(answer.governing.kMatPerStressMPaSqrtMm)).toBeCloseTo(130 / 1.4, 9);
  });

  it('is the coldest where all are stressed alike', () => {
    const alike = cases.map((each) => ({ ...each, stressFactor: 1 }));
    expect(governingTemperature(alike, ofTable)).toMatchObject({
      governing: { loadCase: { name: 'start-up' } },
    });
  });

  it('is the first of equals', () => {
    const twins = ['one', 'two'].map((name) => ({ name, temperatureC: 0, stressFactor: 1 }));
    expect(governingTemperature(twins, ofTable)).toMatchObject({
      governing: { loadCase: { name: 'one' } },
    });
  });

  it('is refused with the name of the case whose toughness is unknown', () => {
    const cold = [...cases, { name: 'blowdown', temperatureC: -80, stressFactor: 0.2 }];
    const answer = governingTemperature(cold, ofTable);
    expect(answer).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'loadCases.3.temperatureC' }],
    });
    if (answer.status === 'refused') expect(answer.refusals[0]?.message).toMatch(/^blowdown/);
  });

  it.each([0, -1, Number.NaN])('refuses a stress factor of %d', (stressFactor) => {
    const answer = governingTemperature([{ name: 'x', temperatureC: 0, stressFactor }], ofTable);
    expect(answer).toMatchObject({ refusals: [{ input: 'loadCases.0.stressFactor' }] });
  });

  it('is refused without a load case', () => {
    expect(governingTemperature([], ofTable)).toMatchObject({ refusals: [{ input: 'loadCases' }] });
  });
});
