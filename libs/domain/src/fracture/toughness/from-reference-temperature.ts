import { outOfBounds, refused, type Refusal } from '../../geometry/refusal';
import {
  MASTER_CURVE_SPAN_C,
  MASTER_CURVE_YIELD_MPA,
  masterCurveBoundMPaSqrtM,
  masterCurveFractileMPaSqrtM,
  ONE_INCH_MM,
  T0_ALLOWANCE_C,
  toFrontLengthMPaSqrtM,
} from '../../materials/toughness/master-curve';
import { t0FromT27, t0FromT40 } from '../../materials/toughness/reference-temperature';
import type { Given } from '../../units/provenance';
import { foundFromMPaSqrtM, type ToughnessResult, type ToughnessStep } from './toughness-result';
import { rule, ruleOf } from './toughness-rules';

/** What the reference temperature is known from, and its value [°C]. */
export interface ReferenceTemperatureInput {
  readonly from: 'T0' | 'T27J' | 'T40J';
  readonly valueC: Given;
}

/** The master curve at one temperature. */
export interface MasterCurveInput {
  readonly reference: ReferenceTemperatureInput;
  readonly temperatureC: number;
  /** Length of the crack front, usually the wall thickness [mm]. */
  readonly thicknessMm: number;
  /** Share of fronts below the value. */
  readonly probability: number;
  /** Allowance on the reference temperature; the usual one where null [°C]. */
  readonly allowanceC: number | null;
  readonly yieldMPa: number;
  /** BS 7910 refers to a front of 25 mm, ASTM E1921 to 25.4 mm. */
  readonly form: 'BS 7910' | 'ASTM E1921';
}

const T0_OF = { T0: (value: number) => value, T27J: t0FromT27, T40J: t0FromT40 } as const;
const T0_WORDS = {
  T0: { formula: 'as given', source: 'fracture toughness tests, ASTM E1921' },
  T27J: {
    formula: 'T27J − 18',
    source: 'JCSS Probabilistic Model Code Part 3.12; BS 7910:2013 Annex J (from memory)',
  },
  T40J: { formula: 'T40J − 24', source: 'BS 7910:2013 Annex J (from memory)' },
} as const;
const CURVE_WORDS = {
  'BS 7910': {
    formula: '20 + {11 + 77 exp[0.019 (T − T0 − Tk)]} (25/B)^¼ (−ln(1 − P))^¼',
    source: 'BS 7910:2013 Annex J (from memory)',
  },
  'ASTM E1921': {
    formula: '20 + {11 + 77 exp[0.019 (T − T0 − Tk)]} (25.4/B)^¼ (−ln(1 − P))^¼',
    source: 'ASTM E1921 (from memory)',
  },
} as const;

/** The allowance a reference temperature takes by default: none where fracture tests gave it. */
const usualAllowance = ({ from }: ReferenceTemperatureInput): number =>
  from === 'T0' ? 0 : T0_ALLOWANCE_C;

/** Toughness from the master curve at a temperature, front length and probability. */
export function toughnessFromMasterCurve(input: MasterCurveInput): ToughnessResult {
  const { reference, temperatureC, thicknessMm, probability, yieldMPa, form } = input;
  const allowanceC = input.allowanceC ?? usualAllowance(reference);
  const t0 = T0_OF[reference.from](reference.valueC.value);
  const refusals = outOfBounds([
    ruleOf('temperature', 'reference.valueC', reference.valueC),
    rule('temperature', 'temperatureC', temperatureC),
    rule('thickness', 'thicknessMm', thicknessMm),
    rule('probability', 'probability', probability),
    rule('allowance', 'allowanceC', allowanceC),
    { ...rule('strength', 'yieldMPa', yieldMPa), ...MASTER_CURVE_YIELD_MPA, instead: YIELD },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const away = outsideSpan(temperatureC, t0);
  if (away) return refused(away);
  const value =
    form === 'BS 7910'
      ? masterCurveBoundMPaSqrtM(temperatureC, { t0C: t0, thicknessMm, probability, allowanceC })
      : toFrontLengthMPaSqrtM(
          masterCurveFractileMPaSqrtM(temperatureC, t0 + allowanceC, probability),
          ONE_INCH_MM,
          thicknessMm,
        );
  return foundFromMPaSqrtM(value, {
    method: `Master curve, ${100 * probability} % fractile`,
    ...CURVE_WORDS[form],
    inputs: [
      `T = ${temperatureC} °C`,
      `B = ${thicknessMm} mm`,
      `P = ${probability}`,
      `Tk = ${allowanceC} °C`,
    ],
    given: [reference.valueC],
    temperatureC,
    before: [t0Step(reference, t0)],
    cautions: [
      'The master curve speaks of cleavage: the upper shelf may be lower and must be checked.',
    ],
  });
}

const YIELD =
  'The master curve is for ferritic steel of this strength; use fracture tests of the steel.';

const t0Step = ({ from, valueC }: ReferenceTemperatureInput, t0: number): ToughnessStep => ({
  symbol: 'T0',
  name: 'Reference temperature',
  value: t0,
  unit: '°C',
  ...T0_WORDS[from],
  inputs: [`${from} = ${valueC.value} °C`],
});

function outsideSpan(temperature: number, t0: number): Refusal | null {
  const away = temperature - t0;
  if (Math.abs(away) <= MASTER_CURVE_SPAN_C) return null;
  const limit = `T0 − ${MASTER_CURVE_SPAN_C} to T0 + ${MASTER_CURVE_SPAN_C} °C`;
  return {
    input: 'temperatureC',
    limit,
    value: temperature,
    message: `${temperature} °C is ${away} °C from T0 = ${t0} °C; the master curve holds from ${limit}.`,
    instead:
      away > 0
        ? 'Use the upper-shelf toughness, or that at T0 + 50 °C if it is lower.'
        : 'Use fracture tests at the temperature.',
  };
}
