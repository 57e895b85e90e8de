import { outOfBounds, refused, type Refusal } from '../../geometry/refusal';
import {
  charpyLowerBoundMPaSqrtM,
  charpyShelfMPaSqrtM,
  charpyTransitionMPaSqrtM,
  shelfAtTearingMPaSqrtM,
  upperShelfMPaSqrtM,
} from '../../materials/toughness/charpy';
import type { Given } from '../../units/provenance';
import { foundFromMPaSqrtM, type ToughnessResult, type ToughnessStep } from './toughness-result';
import { rule, ruleOf } from './toughness-rules';

/** Charpy energy at the temperature of the assessment. */
export interface CharpyInput {
  readonly energyJ: Given;
  readonly thicknessMm: number;
  readonly temperatureC: number;
}

const ANNEX_J = 'BS 7910:2013 Annex J.2 (from memory; form seen in a secondary source)';
// 12 √Cv = 20
const LEAST_ENERGY = 2.78;

/** Lower bound of toughness from Charpy energy: the transition form, capped by the upper shelf. */
export function toughnessFromCharpy(input: CharpyInput): ToughnessResult {
  const { energyJ, thicknessMm, temperatureC } = input;
  const refusals = outOfBounds([
    { ...ruleOf('energy', 'energyJ', energyJ), min: LEAST_ENERGY },
    rule('thickness', 'thicknessMm', thicknessMm),
    rule('temperature', 'temperatureC', temperatureC),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const transition = charpyTransitionMPaSqrtM(energyJ.value, thicknessMm);
  const shelf = charpyShelfMPaSqrtM(energyJ.value);
  return foundFromMPaSqrtM(charpyLowerBoundMPaSqrtM(energyJ.value, thicknessMm), {
    method: 'Lower bound from Charpy energy',
    formula: 'the lesser of transition and shelf',
    source: ANNEX_J,
    inputs: [`Cv = ${energyJ.value} J`, `B = ${thicknessMm} mm`],
    given: [energyJ],
    temperatureC,
    before: [
      step('Transition', transition, '(12 √Cv − 20)(25/B)^¼ + 20'),
      step('Upper shelf', shelf, '0.54 Cv + 55'),
    ],
    cautions: [
      'The energy must be that at the temperature of the assessment, in the weakest zone the flaw reaches.',
    ],
  });
}

const step = (name: string, value: number, formula: string): ToughnessStep => ({
  symbol: 'K',
  name,
  value,
  unit: 'MPa·√m',
  formula,
  source: ANNEX_J,
  inputs: [],
});

/** Charpy energy on the upper shelf. */
export interface ShelfInput {
  readonly energyJ: Given;
  readonly form: 'yield' | 'tearing';
  readonly yieldMPa: number;
  readonly youngsModulusMPa: number;
  readonly poissonsRatio: number;
  /** Share of ductile fracture the specimens showed; 1 is wholly ductile. */
  readonly ductileShare: number;
  readonly temperatureC: number;
}

const SHELF = {
  yield: {
    formula: 'σY √(0.64 (Cv/σY − 0.01))',
    source: 'Barsom and Rolfe, Fracture and Fatigue Control in Structures (from memory)',
  },
  tearing: {
    formula: '√(E J/(1 − ν²)), J = 0.53 Cv^1.28 0.2^(0.133 Cv^0.256)',
    source: 'SINTAP (1999), FITNET (from memory)',
  },
} as const;

/** Upper-shelf toughness from Charpy energy; only of specimens that broke wholly ductile. */
export function toughnessOnShelf(input: ShelfInput): ToughnessResult {
  const { energyJ, form, yieldMPa, youngsModulusMPa, poissonsRatio, temperatureC } = input;
  const refusals = outOfBounds([
    ruleOf('energy', 'energyJ', energyJ),
    rule('strength', 'yieldMPa', yieldMPa),
    rule('modulus', 'youngsModulusMPa', youngsModulusMPa),
    rule('poisson', 'poissonsRatio', poissonsRatio),
    rule('temperature', 'temperatureC', temperatureC),
  ]);
  const unfit = notOnShelf(input);
  if (refusals.length + unfit.length > 0) return refused(...refusals, ...unfit);
  const value =
    form === 'yield'
      ? upperShelfMPaSqrtM(energyJ.value, yieldMPa)
      : shelfAtTearingMPaSqrtM(energyJ.value, youngsModulusMPa, poissonsRatio);
  return foundFromMPaSqrtM(value, {
    method: form === 'yield' ? 'Upper shelf by yield strength' : 'Upper shelf at 0.2 mm of tearing',
    ...SHELF[form],
    inputs: [`Cv = ${energyJ.value} J`, `σY = ${yieldMPa} MPa`],
    given: [energyJ],
    temperatureC,
    cautions: [
      'Holds on the upper shelf only: not at a lower temperature than the specimens broke at.',
    ],
  });
}

function notOnShelf({ energyJ, form, yieldMPa, ductileShare }: ShelfInput): readonly Refusal[] {
  const brittle: readonly Refusal[] =
    ductileShare >= 1
      ? []
      : [
          {
            input: 'ductileShare',
            limit: '1 (wholly ductile)',
            value: Number.isFinite(ductileShare) ? ductileShare : String(ductileShare),
            message: `The specimens showed a ductile share of ${ductileShare}; the shelf starts at 1.`,
            instead: 'Use the lower bound from Charpy energy or the master curve.',
          },
        ];
  const ratio = energyJ.value / yieldMPa;
  const low: readonly Refusal[] =
    form === 'tearing' || ratio > 0.01
      ? []
      : [
          {
            input: 'energyJ',
            limit: 'Cv/σY > 0.01',
            value: Number.isFinite(ratio) ? ratio : String(ratio),
            message: `Cv/σY is ${ratio}; the form of the upper shelf holds above 0.01.`,
            instead: 'Use the lower bound from Charpy energy.',
          },
        ];
  return [...brittle, ...low];
}
