import type { Refused } from '../../geometry/refusal';
import type { Given } from '../../units/provenance';
import { toughnessFromCharpy, toughnessOnShelf } from './from-charpy';
import { toughnessFromReferenceCurve } from './from-reference-curve';
import { toughnessFromMasterCurve } from './from-reference-temperature';
import { toughnessFromCtod, toughnessFromJ, toughnessFromKIc } from './from-specimen';
import type { ToughnessResult } from './toughness-result';
import { strengthAtTemperature } from './strength-at-temperature';

const given = (value: number): Given => ({ value, provenance: 'measured', note: '' });

/** What a method gives for plain numbers by field, every one sound as it stands. */
interface Subject {
  readonly sound: Readonly<Record<string, number>>;
  readonly run: (n: Readonly<Record<string, number>>) => ToughnessResult | Refused | object;
}

const of = (n: Readonly<Record<string, number>>, key: string): number => n[key] ?? Number.NaN;
const elastic = (n: Readonly<Record<string, number>>) => ({
  youngsModulusMPa: of(n, 'youngsModulusMPa'),
  poissonsRatio: of(n, 'poissonsRatio'),
});
const ELASTIC = { youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

const SUBJECTS: Readonly<Record<string, Subject>> = {
  'a plane-strain test': {
    sound: {
      kQMPaSqrtM: 50,
      yieldMPa: 500,
      crackLengthMm: 30,
      thicknessMm: 30,
      ligamentMm: 30,
      loadRatio: 1.05,
      temperatureC: -20,
    },
    run: (n) =>
      toughnessFromKIc({
        kQMPaSqrtM: given(of(n, 'kQMPaSqrtM')),
        yieldMPa: of(n, 'yieldMPa'),
        crackLengthMm: of(n, 'crackLengthMm'),
        thicknessMm: of(n, 'thicknessMm'),
        ligamentMm: of(n, 'ligamentMm'),
        loadRatio: of(n, 'loadRatio'),
        temperatureC: of(n, 'temperatureC'),
      }),
  },
  'a critical J': {
    sound: { jNPerMm: 100, temperatureC: 0, ...ELASTIC },
    run: (n) =>
      toughnessFromJ({
        jNPerMm: given(of(n, 'jNPerMm')),
        temperatureC: of(n, 'temperatureC'),
        ...elastic(n),
      }),
  },
  'a critical CTOD': {
    sound: { ctodMm: 0.2, yieldMPa: 350, tensileMPa: 500, temperatureC: 0, ...ELASTIC },
    run: (n) =>
      toughnessFromCtod({
        ctodMm: given(of(n, 'ctodMm')),
        yieldMPa: of(n, 'yieldMPa'),
        tensileMPa: of(n, 'tensileMPa'),
        temperatureC: of(n, 'temperatureC'),
        ...elastic(n),
      }),
  },
  'Charpy energy': {
    sound: { energyJ: 40, thicknessMm: 25, temperatureC: 0 },
    run: (n) =>
      toughnessFromCharpy({
        energyJ: given(of(n, 'energyJ')),
        thicknessMm: of(n, 'thicknessMm'),
        temperatureC: of(n, 'temperatureC'),
      }),
  },
  'the upper shelf': {
    sound: { energyJ: 100, yieldMPa: 450, temperatureC: 20, ...ELASTIC },
    run: (n) =>
      toughnessOnShelf({
        energyJ: given(of(n, 'energyJ')),
        form: 'yield',
        yieldMPa: of(n, 'yieldMPa'),
        ductileShare: 1,
        temperatureC: of(n, 'temperatureC'),
        ...elastic(n),
      }),
  },
  'the master curve': {
    sound: {
      'reference.valueC': -30,
      temperatureC: 0,
      thicknessMm: 25,
      probability: 0.05,
      allowanceC: 25,
      yieldMPa: 350,
    },
    run: (n) =>
      toughnessFromMasterCurve({
        reference: { from: 'T0', valueC: given(of(n, 'reference.valueC')) },
        temperatureC: of(n, 'temperatureC'),
        thicknessMm: of(n, 'thicknessMm'),
        probability: of(n, 'probability'),
        allowanceC: of(n, 'allowanceC'),
        yieldMPa: of(n, 'yieldMPa'),
        form: 'ASTM E1921',
      }),
  },
  'a reference curve': {
    sound: { referenceC: -10, temperatureC: 20 },
    run: (n) =>
      toughnessFromReferenceCurve({
        curve: 'initiation',
        referenceC: given(of(n, 'referenceC')),
        temperatureC: of(n, 'temperatureC'),
      }),
  },
  'strength in the cold': {
    sound: { yieldMPa: 350, tensileMPa: 500, temperatureC: -40 },
    run: (n) =>
      strengthAtTemperature({
        yieldMPa: given(of(n, 'yieldMPa')),
        tensileMPa: given(of(n, 'tensileMPa')),
        temperatureC: of(n, 'temperatureC'),
      }),
  },
};

const isRefused = (answer: object): answer is Refused =>
  (answer as { readonly status?: unknown }).status === 'refused';

/** Numbers no field may hold; a temperature may be 0, a Poisson's ratio and an allowance too. */
const mayBeZero = (field: string) =>
  /temperatureC|poissonsRatio|allowanceC|referenceC|valueC/.test(field);
const badFor = (field: string, sound: number): readonly number[] => [
  Number.NaN,
  Infinity,
  -Infinity,
  ...(mayBeZero(field) ? [] : [0, -sound, sound * 1000]),
];

describe.each(Object.entries(SUBJECTS))('%s', (_, { sound, run }) => {
  it('is found for sound numbers', () => {
    expect(isRefused(run(sound))).toBe(false);
  });

  it.each(Object.entries(sound))('refuses a bad %s by name', (field, value) => {
    for (const bad of badFor(field, value)) {
      const answer = run({ ...sound, [field]: bad });
      expect(isRefused(answer)).toBe(true);
      if (!isRefused(answer)) continue;
      expect(answer.refusals.map(({ input }) => input)).toContain(field);
      for (const { limit, message, instead } of answer.refusals) {
        expect(limit.length).toBeGreaterThan(0);
        expect(message).not.toMatch(/undefined/);
        expect(instead.length).toBeGreaterThan(5);
      }
    }
  });
});
