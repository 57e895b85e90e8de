import type { NumberRule } from '../../geometry/refusal';
import type { Given } from '../../units/provenance';

/** Bounds that catch a wrong unit, by kind of number; the field they are entered in is named by the caller. */
type Kind = Omit<NumberRule, 'input' | 'value'>;

const KINDS = {
  temperature: {
    name: 'Temperature',
    unit: '°C',
    min: -273.15,
    max: 1000,
    instead: 'Give it in °C.',
  },
  thickness: {
    name: 'Thickness',
    unit: 'mm',
    min: 1,
    max: 1000,
    instead: 'Give it in millimetres.',
  },
  energy: {
    name: 'Charpy energy',
    unit: 'J',
    min: 3,
    max: 450,
    instead: 'Give the energy of a full-size specimen in joules.',
  },
  toughness: {
    name: 'Toughness',
    unit: 'MPa·√m',
    min: 5,
    max: 1000,
    instead: 'Give it in MPa·√m; a value in MPa·√mm is 31.6 times larger.',
  },
  j: {
    name: 'Critical J',
    unit: 'N/mm',
    min: 0.1,
    max: 5000,
    instead: 'Give it in N/mm, which is kJ/m².',
  },
  ctod: {
    name: 'Critical CTOD',
    unit: 'mm',
    min: 0.0005,
    max: 10,
    instead: 'Give it in millimetres.',
  },
  strength: {
    name: 'Strength',
    unit: 'MPa',
    min: 50,
    max: 3000,
    instead: 'Give it in MPa; a value in ksi is 6.9 times smaller.',
  },
  modulus: {
    name: 'Young’s modulus',
    unit: 'MPa',
    min: 3e4,
    max: 4.5e5,
    instead: 'Give it in MPa: steel has about 207 000 MPa.',
  },
  poisson: {
    name: 'Poisson’s ratio',
    unit: '',
    min: 0,
    max: 0.5,
    instead: 'Steel has about 0.3.',
  },
  probability: {
    name: 'Probability',
    unit: '',
    min: 1e-6,
    max: 0.5,
    instead: 'Give the share of fronts below the value, e.g. 0.05; at most the median.',
  },
  allowance: {
    name: 'Allowance on temperature',
    unit: '°C',
    min: 0,
    max: 100,
    instead: 'Give it in °C; 25 °C for a reference temperature from Charpy tests.',
  },
  length: {
    name: 'Length of the specimen',
    unit: 'mm',
    min: 1,
    max: 1000,
    instead: 'Give it in millimetres.',
  },
  tearingCoefficient: {
    name: 'Coefficient C',
    unit: 'N/mm per mm^m',
    min: 1,
    max: 1e4,
    instead: 'Fit JR = C Δa^m to the test with J in N/mm and Δa in mm.',
  },
  tearingExponent: {
    name: 'Exponent m',
    unit: '',
    min: 0.01,
    max: 0.99,
    instead: 'Fit JR = C Δa^m to the test with J in N/mm and Δa in mm.',
  },
  extension: {
    name: 'Valid extension',
    unit: 'mm',
    min: 0,
    max: 100,
    instead: 'Give the largest extension the tests are valid to, in millimetres.',
  },
  loadRatio: {
    name: 'Pmax/PQ',
    unit: '',
    min: 1,
    max: 1.1,
    instead: 'Above 1.10 the test is no plane-strain test: use its J or CTOD.',
  },
} as const satisfies Readonly<Record<string, Kind>>;

/** The rule of one number entered in a named field. */
export const rule = (kind: keyof typeof KINDS, input: string, value: number): NumberRule => ({
  ...KINDS[kind],
  input,
  value,
});

/** The same for a number with its origin. */
export const ruleOf = (kind: keyof typeof KINDS, input: string, given: Given): NumberRule =>
  rule(kind, input, given.value);
