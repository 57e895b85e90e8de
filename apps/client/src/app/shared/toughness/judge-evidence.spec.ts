import { toughnessAt } from '@ligament/domain/fracture/toughness/find-toughness';
import { referenceTemperature } from '@ligament/domain/fracture/toughness/reference-temperature-tests';
import type { ToughnessResult } from '@ligament/domain/fracture/toughness/toughness-result';
import { toMPaSqrtM } from '@ligament/domain/units/convert';
import type { Given, Provenance } from '@ligament/domain/units/provenance';
import { type Evidence, startOf } from './evidence';
import { basisOf, testsOf } from './evidence-basis';
import { type EvidenceKind, KINDS, type NumberName } from './evidence-kinds';
import { judgeEvidence } from './judge-evidence';

const given = (value: number, provenance: Provenance = 'certificate'): Given => ({
  value,
  provenance,
  note: 'report 12',
});
const NUMBERS: Readonly<Partial<Record<NumberName, Given>>> = {
  testTemperatureC: given(-20),
  thicknessMm: given(25, 'measured'),
  kQMPaSqrtM: given(40),
  crackLengthMm: given(50),
  specimenMm: given(50),
  specimenLigamentMm: given(50),
  loadRatio: given(1.05),
  jNPerMm: given(60),
  ctodMm: given(0.1),
  energyJ: given(40),
  ductileShare: given(1),
  yieldMPa: given(350),
  tensileMPa: given(500),
  youngsModulusMPa: given(207000, 'standard default'),
  poissonsRatio: given(0.3, 'standard default'),
  'reference.valueC': given(-30),
  referenceC: given(-10),
};
const TEST = { temperatureC: -60, thicknessMm: 25, censored: false };
const start = startOf({ numbers: NUMBERS });

const evidenceOf = (kind: EvidenceKind, change: Partial<Evidence> = {}): Evidence => ({
  ...start,
  kind,
  lists: {
    table: [
      { temperatureC: -40, kMPaSqrtM: 50 },
      { temperatureC: 20, kMPaSqrtM: 120 },
    ],
    tests: [70, 80, 90, 100, 110, 120].map((kJcMPaSqrtM) => ({ ...TEST, kJcMPaSqrtM })),
  },
  listOrigin: { provenance: 'measured', note: 'report 13' },
  ...change,
});

const figure = (result: ToughnessResult) => {
  if (result.status === 'refused') throw new Error(JSON.stringify(result.refusals));
  return toMPaSqrtM(result.kMatMPaSqrtMm);
};
const inputsOf = (result: ToughnessResult) =>
  result.status === 'refused' ? result.refusals.map(({ input }) => input) : [];

describe('judgeEvidence', () => {
  const direct = (Object.keys(KINDS) as EvidenceKind[]).filter((kind) => kind !== 'tests');

  it.each(direct)('gives the figure of the engine from %s', (kind) => {
    const evidence = evidenceOf(kind);
    const engine = toughnessAt(basisOf(evidence, kind as 'KIc'), -20);
    const value = figure(judgeEvidence(evidence, -20));
    expect(value).toBe(figure(engine));
    expect(value).toBeGreaterThan(20);
  });

  it('hands over every number of a test where the engine wants it', () => {
    // √(J E/(1 − ν²)) = √(60 · 207000/0.91) MPa·√mm
    expect(figure(judgeEvidence(evidenceOf('J'), -20))).toBeCloseTo(
      Math.sqrt((60 * 207000) / 0.91 / 1000),
      6,
    );
    // (12 √40 − 20)(25/25)^¼ + 20 = 12 √40
    const charpy = figure(judgeEvidence(evidenceOf('Charpy'), -20));
    expect(charpy).toBeCloseTo(12 * Math.sqrt(40), 6);
    expect(figure(judgeEvidence(evidenceOf('KIc'), -20))).toBeCloseTo(40, 6);
  });

  it('finds T0 from tests, then reads the master curve by it without an allowance', () => {
    const evidence = evidenceOf('tests');
    const reference = referenceTemperature(testsOf(evidence));
    if (reference.status === 'refused') throw new Error('refused');
    const byT0 = evidenceOf('master curve', {
      words: { ...start.words, from: 'T0' },
      numbers: { ...start.numbers, 'reference.valueC': given(reference.t0C) },
    });
    const result = judgeEvidence(evidence, -60);
    expect(figure(result)).toBe(figure(judgeEvidence(byT0, -60)));
    expect(result).toMatchObject({
      source: expect.stringContaining('T0 from 6 tests'),
      steps: [{ symbol: 'T0', value: reference.t0C }, { symbol: 's' }, { symbol: 'Kmat' }],
    });
  });

  it('takes the weakest origin of all that it rests on, and only of that', () => {
    expect(judgeEvidence(evidenceOf('J'), -20)).toMatchObject({ provenance: 'standard default' });
    expect(judgeEvidence(evidenceOf('Charpy'), -20)).toMatchObject({ provenance: 'certificate' });
    const table = evidenceOf('table');
    expect(judgeEvidence(table, -20)).toMatchObject({ provenance: 'measured' });
    const guessed = evidenceOf('Charpy', {
      numbers: { ...start.numbers, thicknessMm: given(25, 'assumed') },
    });
    expect(judgeEvidence(guessed, -20)).toMatchObject({ provenance: 'assumed' });
  });

  it('names the field at fault, and tells the temperature of the test from the governing one', () => {
    const without = (name: NumberName, value: number): Evidence => {
      const numbers = { ...start.numbers, [name]: given(value) };
      return evidenceOf('KIc', { numbers });
    };
    expect(inputsOf(judgeEvidence(without('testTemperatureC', Number.NaN), -20))).toEqual([
      'testTemperatureC',
    ]);
    expect(inputsOf(judgeEvidence(without('kQMPaSqrtM', 40), -40))).toEqual(['temperatureC']);
    expect(inputsOf(judgeEvidence(without('specimenMm', 5), -20))).toEqual(['specimenMm']);
    expect(inputsOf(judgeEvidence(without('specimenLigamentMm', 5), -20))).toEqual([
      'specimenLigamentMm',
    ]);
  });

  it('names the shared strength and not the test where the capacity cannot be judged', () => {
    const lists = {
      table: [],
      tests: [{ ...TEST, kJcMPaSqrtM: 80, ligamentMm: 20 }],
    };
    const numbers = { ...start.numbers, yieldMPa: given(-1) };
    expect(inputsOf(judgeEvidence(evidenceOf('tests', { lists, numbers }), -60))).toEqual([
      'yieldMPa',
    ]);
  });
});
