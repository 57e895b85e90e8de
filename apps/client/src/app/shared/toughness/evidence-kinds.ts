interface NumberWords {
  readonly label: string;
  readonly unit: string;
  /** A choice of the person who assesses: it has no origin. */
  readonly chosen?: true;
  readonly optional?: true;
}

/** Every number some kind of evidence needs, by the name a refusal gives it. */
export const NUMBERS = {
  temperatureC: { label: 'Governing temperature', unit: '°C', chosen: true },
  testTemperatureC: { label: 'Temperature of the test', unit: '°C' },
  thicknessMm: { label: 'Wall thickness', unit: 'mm' },
  kQMPaSqrtM: { label: 'KQ of the test', unit: 'MPa·√m' },
  crackLengthMm: { label: 'Crack length of the specimen', unit: 'mm' },
  specimenMm: { label: 'Thickness of the specimen', unit: 'mm' },
  specimenLigamentMm: { label: 'Ligament of the specimen', unit: 'mm' },
  loadRatio: { label: 'Pmax/PQ', unit: '' },
  jNPerMm: { label: 'Critical J', unit: 'N/mm' },
  ctodMm: { label: 'Critical CTOD', unit: 'mm' },
  energyJ: { label: 'Charpy energy', unit: 'J' },
  ductileShare: { label: 'Ductile share of the fracture, 0 to 1', unit: '' },
  yieldMPa: { label: 'Yield strength', unit: 'MPa' },
  tensileMPa: { label: 'Tensile strength', unit: 'MPa' },
  youngsModulusMPa: { label: 'Young’s modulus', unit: 'MPa' },
  poissonsRatio: { label: 'Poisson’s ratio', unit: '' },
  'reference.valueC': { label: 'T0, T27J or T40J', unit: '°C' },
  referenceC: { label: 'Reference temperature of the curve', unit: '°C' },
  probability: { label: 'Share of fronts below the value', unit: '', chosen: true },
  allowanceC: {
    label: 'Allowance on T0, if not usual',
    unit: '°C',
    chosen: true,
    optional: true,
  },
} as const satisfies Readonly<Record<string, NumberWords>>;
export type NumberName = keyof typeof NUMBERS;

export const wordsOf = (name: NumberName): NumberWords => NUMBERS[name];

/** Every word some kind of evidence needs chosen. */
export const WORDS = {
  from: { label: 'The reference temperature is', options: ['T0', 'T27J', 'T40J'] },
  form: { label: 'Form of the master curve', options: ['BS 7910', 'ASTM E1921'] },
  shelf: { label: 'Form of the upper shelf', options: ['yield', 'tearing'] },
  curve: {
    label: 'Curve',
    options: ['initiation', 'initiation, metric', 'arrest', 'exemption'],
  },
} as const;
export type WordName = keyof typeof WORDS;

/** One column of a list that is filled in. */
export interface Column {
  readonly name: string;
  readonly label: string;
  readonly kind: 'number' | 'text' | 'flag';
}

/** Every list some kind of evidence needs. */
export const LISTS = {
  table: [
    { name: 'temperatureC', label: 'Temperature [°C]', kind: 'number' },
    { name: 'kMPaSqrtM', label: 'Kmat [MPa·√m]', kind: 'number' },
  ],
  tests: [
    { name: 'temperatureC', label: 'Temperature [°C]', kind: 'number' },
    { name: 'kJcMPaSqrtM', label: 'KJc [MPa·√m]', kind: 'number' },
    { name: 'thicknessMm', label: 'Thickness [mm]', kind: 'number' },
    { name: 'ligamentMm', label: 'Ligament [mm], if to be judged', kind: 'number' },
    { name: 'censored', label: 'Did not cleave', kind: 'flag' },
  ],
} as const satisfies Readonly<Record<string, readonly Column[]>>;
export type ListName = keyof typeof LISTS;

interface KindWords {
  readonly label: string;
  readonly numbers: readonly NumberName[];
  readonly words: readonly WordName[];
  readonly list: ListName | null;
}

const kind = (
  label: string,
  numbers: readonly NumberName[],
  words: readonly WordName[] = [],
  list: ListName | null = null,
): KindWords => ({ label, numbers, words, list });
const ELASTIC = ['youngsModulusMPa', 'poissonsRatio'] as const;
const MASTER = ['thicknessMm', 'yieldMPa', 'probability', 'allowanceC'] as const;
const SPECIMEN = ['crackLengthMm', 'specimenMm', 'specimenLigamentMm'] as const;

/** What toughness may be known from, and what each needs beside the governing temperature. */
export const KINDS = {
  KIc: kind('Plane-strain test, KIc', [
    'kQMPaSqrtM',
    'testTemperatureC',
    'yieldMPa',
    ...SPECIMEN,
    'loadRatio',
  ]),
  J: kind('Critical J', ['jNPerMm', 'testTemperatureC', ...ELASTIC]),
  CTOD: kind('Critical CTOD', ['ctodMm', 'testTemperatureC', 'yieldMPa', 'tensileMPa', ...ELASTIC]),
  Charpy: kind('Lower bound from Charpy energy', ['energyJ', 'testTemperatureC', 'thicknessMm']),
  'upper shelf': kind(
    'Upper shelf from Charpy energy',
    ['energyJ', 'testTemperatureC', 'ductileShare', 'yieldMPa', ...ELASTIC],
    ['shelf'],
  ),
  'master curve': kind(
    'Master curve by T0, T27J or T40J',
    ['reference.valueC', ...MASTER],
    ['from', 'form'],
  ),
  'reference curve': kind('Lower-bound reference curve', ['referenceC'], ['curve']),
  table: kind('Table against temperature', [], [], 'table'),
  tests: kind('Master curve, T0 from tests', [...MASTER, ...ELASTIC], ['form'], 'tests'),
} as const satisfies Readonly<Record<string, KindWords>>;
export type EvidenceKind = keyof typeof KINDS;

export const kindWords = (name: EvidenceKind): KindWords => KINDS[name];
