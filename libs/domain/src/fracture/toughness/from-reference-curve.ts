import { outOfBounds, refused } from '../../geometry/refusal';
import {
  arrestCurveMPaSqrtM,
  exemptionCurveMPaSqrtM,
  initiationCurveMetricMPaSqrtM,
  initiationCurveMPaSqrtM,
} from '../../materials/toughness/reference-curves';
import type { Given } from '../../units/provenance';
import { foundFromMPaSqrtM, type ToughnessResult } from './toughness-result';
import { rule, ruleOf } from './toughness-rules';

const ASME = 'ASME XI A-4200 (from memory; value at RTNDT seen in a script that quotes it)';

/** Lower-bound curves of vessel steel by a reference temperature. */
export const REFERENCE_CURVES = {
  initiation: {
    method: 'Initiation curve, KIc',
    formula: '33.2 + 20.734 exp(0.02 ΔT), ksi·√in and °F, at most 200',
    source: ASME,
    of: initiationCurveMPaSqrtM,
  },
  'initiation, metric': {
    method: 'Initiation curve, KIc, SI constants',
    formula: '36.5 + 22.783 exp(0.036 ΔT), MPa·√m and °C, at most 219.8',
    source: 'ASME XI, SI edition (from memory)',
    of: initiationCurveMetricMPaSqrtM,
  },
  arrest: {
    method: 'Arrest curve, KIa',
    formula: '26.8 + 12.445 exp(0.0145 ΔT), ksi·√in and °F, at most 200',
    source: ASME,
    of: arrestCurveMPaSqrtM,
  },
  exemption: {
    method: 'Lower bound by exemption curve',
    formula: '33.2 + 2.806 exp[0.02 (ΔT + 100)], ksi·√in and °F, at most 200',
    source: 'API 579-1 Annex 9F (from memory)',
    of: exemptionCurveMPaSqrtM,
  },
} as const;
export type ReferenceCurve = keyof typeof REFERENCE_CURVES;

/** A lower-bound curve at one temperature. */
export interface ReferenceCurveInput {
  readonly curve: ReferenceCurve;
  /** RTNDT, or the reference temperature of the exemption curve [°C]. */
  readonly referenceC: Given;
  readonly temperatureC: number;
}

/** Toughness from a lower-bound curve at a temperature. */
export function toughnessFromReferenceCurve(input: ReferenceCurveInput): ToughnessResult {
  const { curve, referenceC, temperatureC } = input;
  const refusals = outOfBounds([
    ruleOf('temperature', 'referenceC', referenceC),
    rule('temperature', 'temperatureC', temperatureC),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const { of, ...words } = REFERENCE_CURVES[curve];
  return foundFromMPaSqrtM(of(temperatureC - referenceC.value), {
    ...words,
    inputs: [`T = ${temperatureC} °C`, `reference ${referenceC.value} °C`],
    given: [referenceC],
    temperatureC,
    cautions: curve === 'exemption' ? ['Not for steel charged with hydrogen in service.'] : [],
  });
}
