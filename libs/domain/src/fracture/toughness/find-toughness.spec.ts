import type { Given } from '../../units/provenance';
import { toMPaSqrtM } from '../../units/convert';
import { toughnessAt, type ToughnessBasis } from './find-toughness';
import { governingTemperature } from './governing-temperature';

const given = (value: number): Given => ({ value, provenance: 'measured', note: '' });
const ELASTIC = { youngsModulusMPa: 207_000, poissonsRatio: 0.3 };
const TESTED: readonly ToughnessBasis[] = [
  {
    method: 'KIc',
    test: {
      kQMPaSqrtM: given(50),
      yieldMPa: 500,
      crackLengthMm: 30,
      thicknessMm: 30,
      ligamentMm: 30,
      loadRatio: 1,
      temperatureC: -20,
    },
  },
  { method: 'J', test: { jNPerMm: given(100), temperatureC: -20, ...ELASTIC } },
  {
    method: 'CTOD',
    test: { ctodMm: given(0.2), yieldMPa: 350, tensileMPa: 500, temperatureC: -20, ...ELASTIC },
  },
  { method: 'Charpy', test: { energyJ: given(40), thicknessMm: 25, temperatureC: -20 } },
  {
    method: 'upper shelf',
    test: {
      energyJ: given(120),
      form: 'yield',
      yieldMPa: 400,
      ductileShare: 1,
      temperatureC: -20,
      ...ELASTIC,
    },
  },
];
const MASTER: ToughnessBasis = {
  method: 'master curve',
  curve: {
    reference: { from: 'T0', valueC: given(-30) },
    thicknessMm: 25,
    probability: 0.05,
    allowanceC: null,
    yieldMPa: 350,
    form: 'BS 7910',
  },
};
const CURVE: ToughnessBasis = {
  method: 'reference curve',
  curve: { curve: 'initiation', referenceC: given(0) },
};
const TABLE: ToughnessBasis = {
  method: 'table',
  table: {
    value: [
      { temperatureC: -20, kMPaSqrtM: 80 },
      { temperatureC: 20, kMPaSqrtM: 150 },
    ],
    provenance: 'measured',
    note: '',
  },
};

const valueAt = (basis: ToughnessBasis, temperatureC: number): number => {
  const answer = toughnessAt(basis, temperatureC);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return toMPaSqrtM(answer.kMatMPaSqrtMm);
};

describe.each(TESTED.map((basis) => [basis.method, basis] as const))(
  'a toughness tested by %s',
  (_, basis) => {
    it('holds at its temperature and, with a caution, above it', () => {
      expect(valueAt(basis, 0)).toBe(valueAt(basis, -20));
      const [here, above] = [toughnessAt(basis, -20), toughnessAt(basis, 0)];
      if (here.status === 'refused' || above.status === 'refused') throw new Error('refused');
      expect(above.temperatureC).toBe(0);
      expect(above.cautions).toHaveLength(here.cautions.length + 1);
    });

    it('is refused below its temperature, naming the limit', () => {
      expect(toughnessAt(basis, -21)).toMatchObject({
        status: 'refused',
        refusals: [
          { input: 'temperatureC', limit: 'at least -20 °C, the temperature of the test' },
        ],
      });
    });
  },
);

describe('a toughness known against temperature', () => {
  it.each([
    ['master curve', MASTER],
    ['reference curve', CURVE],
    ['table', TABLE],
  ] as const)('is read at the temperature: %s', (_, basis) => {
    expect(valueAt(basis, 10)).toBeGreaterThan(valueAt(basis, -10));
  });

  it('is refused at a temperature that is none', () => {
    for (const basis of [...TESTED, MASTER, CURVE, TABLE]) {
      expect(toughnessAt(basis, Number.NaN)).toMatchObject({
        refusals: [{ input: 'temperatureC', value: 'NaN' }],
      });
    }
  });

  it('tells which load case governs', () => {
    const cases = [
      { name: 'operation', temperatureC: 15, stressFactor: 1 },
      { name: 'cold start', temperatureC: -20, stressFactor: 0.9 },
    ];
    const answer = governingTemperature(cases, (temperature) => toughnessAt(TABLE, temperature));
    expect(answer).toMatchObject({ governing: { loadCase: { name: 'cold start' } } });
  });
});

it('passes on why a test gives no toughness', () => {
  const basis: ToughnessBasis = {
    method: 'J',
    test: { jNPerMm: given(-1), temperatureC: 0, ...ELASTIC },
  };
  expect(toughnessAt(basis, 0)).toMatchObject({
    status: 'refused',
    refusals: [{ input: 'jNPerMm' }],
  });
});
