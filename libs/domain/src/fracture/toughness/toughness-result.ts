import type { Refused } from '../../geometry/refusal';
import { toMPaSqrtM, toMPaSqrtMm } from '../../units/convert';
import { PROVENANCES, type Given, type Provenance } from '../../units/provenance';
import type { MPaSqrtMm } from '../../units/quantity';

/** One step on the way to a toughness, as the calculation sheet shows it. */
export interface ToughnessStep {
  readonly symbol: string;
  readonly name: string;
  readonly value: number | string;
  readonly unit: string;
  readonly formula: string;
  readonly source: string;
  readonly inputs: readonly string[];
}

/** A toughness with the way it was found. */
export interface FoundToughness {
  readonly status: 'found';
  readonly kMatMPaSqrtMm: MPaSqrtMm;
  readonly method: string;
  readonly source: string;
  /** Weakest origin among the inputs. */
  readonly provenance: Provenance;
  /** Temperature it holds at [°C]. */
  readonly temperatureC: number;
  readonly steps: readonly ToughnessStep[];
  /** What the reader must know though it does not stop the value. */
  readonly cautions: readonly string[];
}

/** A toughness, or why there is none. */
export type ToughnessResult = FoundToughness | Refused;

/** The weakest origin of several inputs. */
export const weakestOrigin = (inputs: readonly Given<unknown>[]): Provenance =>
  PROVENANCES[Math.max(0, ...inputs.map(({ provenance }) => PROVENANCES.indexOf(provenance)))] ??
  'assumed';

/** What a method says of its value beside the value itself. */
export interface MethodWords {
  readonly method: string;
  readonly formula: string;
  readonly source: string;
  readonly inputs: readonly string[];
  readonly given: readonly Given<unknown>[];
  readonly temperatureC: number;
  readonly before?: readonly ToughnessStep[];
  readonly cautions?: readonly string[];
}

/** A toughness from a value in MPa·√m, the unit correlations are written in. */
export const foundFromMPaSqrtM = (value: number, words: MethodWords): FoundToughness =>
  found(toMPaSqrtMm(value, 'MPa·√m'), words);

/** A toughness from a value in MPa·√mm. */
export const found = (
  kMatMPaSqrtMm: MPaSqrtMm,
  { method, formula, source, inputs, given, temperatureC, before = [], cautions = [] }: MethodWords,
): FoundToughness => ({
  status: 'found',
  kMatMPaSqrtMm,
  method,
  source,
  provenance: weakestOrigin(given),
  temperatureC,
  cautions,
  steps: [
    ...before,
    {
      symbol: 'Kmat',
      name: method,
      value: toMPaSqrtM(kMatMPaSqrtMm),
      unit: 'MPa·√m',
      formula,
      source,
      inputs,
    },
  ],
});
