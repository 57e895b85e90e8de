import type { ToughnessBasis } from '@ligament/domain/fracture/toughness/find-toughness';
import type { ReferenceCurve } from '@ligament/domain/fracture/toughness/from-reference-curve';
import type { ReferenceTemperatureInput } from '@ligament/domain/fracture/toughness/from-reference-temperature';
import type { ToughnessTest } from '@ligament/domain/fracture/toughness/reference-temperature-tests';
import { type Evidence, numberOf, type Row } from './evidence';
import type { EvidenceKind, NumberName } from './evidence-kinds';

const valueIn = (evidence: Evidence) => (name: NumberName) => numberOf(evidence, name).value;
const cell = (row: Row, name: string) => {
  const value = row[name];
  return typeof value === 'number' ? value : Number.NaN;
};

const elastic = (evidence: Evidence) => ({
  youngsModulusMPa: numberOf(evidence, 'youngsModulusMPa').value,
  poissonsRatio: numberOf(evidence, 'poissonsRatio').value,
});

/** What the master curve is read with, by a reference temperature. */
export function masterBasis(
  evidence: Evidence,
  reference: ReferenceTemperatureInput,
): ToughnessBasis {
  const value = valueIn(evidence);
  const allowance = value('allowanceC');
  return {
    method: 'master curve',
    curve: {
      reference,
      thicknessMm: value('thicknessMm'),
      probability: value('probability'),
      allowanceC: Number.isNaN(allowance) ? null : allowance,
      yieldMPa: value('yieldMPa'),
      form: evidence.words.form === 'ASTM E1921' ? 'ASTM E1921' : 'BS 7910',
    },
  };
}

type Direct = Exclude<EvidenceKind, 'tests'>;

/** What the engine takes for each kind of evidence. */
const BASES: Readonly<Record<Direct, (evidence: Evidence) => ToughnessBasis>> = {
  KIc: (evidence) => {
    const value = valueIn(evidence);
    return {
      method: 'KIc',
      test: {
        kQMPaSqrtM: numberOf(evidence, 'kQMPaSqrtM'),
        yieldMPa: value('yieldMPa'),
        crackLengthMm: value('crackLengthMm'),
        thicknessMm: value('specimenMm'),
        ligamentMm: value('specimenLigamentMm'),
        loadRatio: value('loadRatio'),
        temperatureC: value('testTemperatureC'),
      },
    };
  },
  J: (evidence) => ({
    method: 'J',
    test: {
      jNPerMm: numberOf(evidence, 'jNPerMm'),
      temperatureC: valueIn(evidence)('testTemperatureC'),
      ...elastic(evidence),
    },
  }),
  CTOD: (evidence) => ({
    method: 'CTOD',
    test: {
      ctodMm: numberOf(evidence, 'ctodMm'),
      yieldMPa: valueIn(evidence)('yieldMPa'),
      tensileMPa: valueIn(evidence)('tensileMPa'),
      temperatureC: valueIn(evidence)('testTemperatureC'),
      ...elastic(evidence),
    },
  }),
  Charpy: (evidence) => ({
    method: 'Charpy',
    test: {
      energyJ: numberOf(evidence, 'energyJ'),
      thicknessMm: valueIn(evidence)('thicknessMm'),
      temperatureC: valueIn(evidence)('testTemperatureC'),
    },
  }),
  'upper shelf': (evidence) => ({
    method: 'upper shelf',
    test: {
      energyJ: numberOf(evidence, 'energyJ'),
      form: evidence.words.shelf === 'tearing' ? 'tearing' : 'yield',
      yieldMPa: valueIn(evidence)('yieldMPa'),
      ductileShare: valueIn(evidence)('ductileShare'),
      temperatureC: valueIn(evidence)('testTemperatureC'),
      ...elastic(evidence),
    },
  }),
  'master curve': (evidence) =>
    masterBasis(evidence, {
      from: evidence.words.from as ReferenceTemperatureInput['from'],
      valueC: numberOf(evidence, 'reference.valueC'),
    }),
  'reference curve': (evidence) => ({
    method: 'reference curve',
    curve: {
      curve: evidence.words.curve as ReferenceCurve,
      referenceC: numberOf(evidence, 'referenceC'),
    },
  }),
  table: ({ lists, listOrigin }) => ({
    method: 'table',
    table: {
      ...listOrigin,
      value: lists.table.map((row) => ({
        temperatureC: cell(row, 'temperatureC'),
        kMPaSqrtM: cell(row, 'kMPaSqrtM'),
      })),
    },
  }),
};

export const basisOf = (evidence: Evidence, kind: Direct): ToughnessBasis => BASES[kind](evidence);

/** The tests as entered; the capacity is judged where a ligament is given. */
export const testsOf = (evidence: Evidence): readonly ToughnessTest[] =>
  evidence.lists.tests.map((row) => {
    const ligamentMm = cell(row, 'ligamentMm');
    return {
      temperatureC: cell(row, 'temperatureC'),
      kJcMPaSqrtM: cell(row, 'kJcMPaSqrtM'),
      thicknessMm: cell(row, 'thicknessMm'),
      censored: row['censored'] === true,
      capacity: Number.isNaN(ligamentMm)
        ? null
        : { ligamentMm, yieldMPa: valueIn(evidence)('yieldMPa'), ...elastic(evidence) },
    };
  });
