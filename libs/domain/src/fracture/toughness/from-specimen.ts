import { outOfBounds, refused, type Refusal } from '../../geometry/refusal';
import {
  CTOD_STRENGTH_RATIO,
  ctodFactor,
  kFromCtod,
  kFromJ,
  planeStrainSize,
} from '../../materials/toughness/from-fracture-test';
import { toMPaSqrtMm } from '../../units/convert';
import type { Given } from '../../units/provenance';
import { mpaSqrtMm } from '../../units/quantity';
import {
  found,
  foundFromMPaSqrtM,
  type ToughnessResult,
  type ToughnessStep,
} from './toughness-result';
import { rule, ruleOf } from './toughness-rules';

/** A plane-strain fracture test as measured. */
export interface PlaneStrainTest {
  /** KQ [MPa·√m]. */
  readonly kQMPaSqrtM: Given;
  readonly yieldMPa: number;
  readonly crackLengthMm: number;
  readonly thicknessMm: number;
  readonly ligamentMm: number;
  /** Greatest load over the load KQ was taken at, Pmax/PQ. */
  readonly loadRatio: number;
  readonly temperatureC: number;
}

const E399 = 'ASTM E399 (from memory)';

/** Toughness from a plane-strain test, or the condition of validity it misses. */
export function toughnessFromKIc(test: PlaneStrainTest): ToughnessResult {
  const { kQMPaSqrtM, yieldMPa, crackLengthMm, thicknessMm, ligamentMm, temperatureC } = test;
  const numbers = outOfBounds([
    ruleOf('toughness', 'kQMPaSqrtM', kQMPaSqrtM),
    rule('strength', 'yieldMPa', yieldMPa),
    rule('length', 'crackLengthMm', crackLengthMm),
    rule('length', 'thicknessMm', thicknessMm),
    rule('length', 'ligamentMm', ligamentMm),
    rule('loadRatio', 'loadRatio', test.loadRatio),
    rule('temperature', 'temperatureC', temperatureC),
  ]);
  if (numbers.length > 0) return refused(...numbers);
  const least = planeStrainSize(toMPaSqrtMm(kQMPaSqrtM.value, 'MPa·√m'), yieldMPa);
  const small = tooSmall(least, { crackLengthMm, thicknessMm, ligamentMm });
  if (small.length > 0) return refused(...small);
  return foundFromMPaSqrtM(kQMPaSqrtM.value, {
    method: 'Plane-strain fracture test',
    formula: 'Kmat = KIc',
    source: E399,
    inputs: [`KQ = ${kQMPaSqrtM.value} MPa·√m`],
    given: [kQMPaSqrtM],
    temperatureC,
    before: [
      {
        symbol: '2.5 (K/σY)²',
        name: 'Least crack length, thickness and ligament',
        value: least,
        unit: 'mm',
        formula: '2.5 (KQ/σY)²',
        source: E399,
        inputs: [`σY = ${yieldMPa} MPa`],
      },
    ],
  });
}

const tooSmall = (least: number, sizes: Readonly<Record<string, number>>): readonly Refusal[] =>
  Object.entries(sizes)
    .filter(([, size]) => size < least)
    .map(([input, size]) => ({
      input,
      limit: `at least 2.5 (KQ/σY)² = ${least.toFixed(1)} mm`,
      value: size,
      message: `${input} is ${size} mm; a plane-strain test needs ${least.toFixed(1)} mm.`,
      instead: 'Use the J or the CTOD of the test, or a larger specimen.',
    }));

/** Elastic constants at the temperature of a test. */
export interface Elasticity {
  readonly youngsModulusMPa: number;
  readonly poissonsRatio: number;
}

/** A critical J as measured. */
export interface JTest extends Elasticity {
  readonly jNPerMm: Given;
  readonly temperatureC: number;
}

/** Toughness from a critical J. */
export function toughnessFromJ(test: JTest): ToughnessResult {
  const { jNPerMm, youngsModulusMPa, poissonsRatio, temperatureC } = test;
  const refusals = outOfBounds([ruleOf('j', 'jNPerMm', jNPerMm), ...commonRules(test)]);
  if (refusals.length > 0) return refused(...refusals);
  return found(mpaSqrtMm(kFromJ(jNPerMm.value, youngsModulusMPa, poissonsRatio)), {
    method: 'Critical J',
    formula: '√(J E/(1 − ν²))',
    source: 'BS 7910:2013 7.1.4 (from memory); Rice 1968',
    inputs: [`J = ${jNPerMm.value} N/mm`, ...elastic(test)],
    given: [jNPerMm],
    temperatureC,
  });
}

/** A critical CTOD as measured. */
export interface CtodTest extends Elasticity {
  readonly ctodMm: Given;
  readonly yieldMPa: number;
  readonly tensileMPa: number;
  readonly temperatureC: number;
}

/** Toughness from a critical CTOD. */
export function toughnessFromCtod(test: CtodTest): ToughnessResult {
  const { ctodMm, yieldMPa, tensileMPa, temperatureC } = test;
  const refusals = outOfBounds([
    ruleOf('ctod', 'ctodMm', ctodMm),
    rule('strength', 'yieldMPa', yieldMPa),
    rule('strength', 'tensileMPa', tensileMPa),
    ...commonRules(test),
  ]);
  const ratio = strengthRatio(yieldMPa, tensileMPa);
  if (refusals.length + ratio.length > 0) return refused(...refusals, ...ratio);
  const source = 'BS 7910:2013 7.1.4.6 (from memory; form seen in a secondary source)';
  return found(mpaSqrtMm(kFromCtod(ctodMm.value, test)), {
    method: 'Critical CTOD',
    formula: '√(m σY δ E/(1 − ν²))',
    source,
    inputs: [`δ = ${ctodMm.value} mm`, `σY = ${yieldMPa} MPa`, ...elastic(test)],
    given: [ctodMm],
    temperatureC,
    before: [factorStep(yieldMPa, tensileMPa, source)],
  });
}

const factorStep = (yieldMPa: number, tensileMPa: number, source: string): ToughnessStep => ({
  symbol: 'm',
  name: 'Factor on CTOD',
  value: ctodFactor(yieldMPa, tensileMPa),
  unit: '',
  formula: '1.517 (σY/σU)^−0.3188',
  source,
  inputs: [`σY = ${yieldMPa} MPa`, `σU = ${tensileMPa} MPa`],
});

function strengthRatio(yieldMPa: number, tensileMPa: number): readonly Refusal[] {
  const { min, max } = CTOD_STRENGTH_RATIO;
  const ratio = yieldMPa / tensileMPa;
  if ((ratio > min && ratio < max) || !Number.isFinite(ratio)) return [];
  const limit = `${min} < σY/σU < ${max}`;
  return [
    {
      input: 'tensileMPa',
      limit,
      value: ratio,
      message: `σY/σU is ${ratio}; the factor on CTOD holds for ${limit}.`,
      instead: 'Check the two strengths, or use the J of the test.',
    },
  ];
}

const commonRules = ({
  youngsModulusMPa,
  poissonsRatio,
  temperatureC,
}: Elasticity & { readonly temperatureC: number }) => [
  rule('modulus', 'youngsModulusMPa', youngsModulusMPa),
  rule('poisson', 'poissonsRatio', poissonsRatio),
  rule('temperature', 'temperatureC', temperatureC),
];

const elastic = ({ youngsModulusMPa, poissonsRatio }: Elasticity): readonly string[] => [
  `E = ${youngsModulusMPa} MPa`,
  `ν = ${poissonsRatio}`,
];
