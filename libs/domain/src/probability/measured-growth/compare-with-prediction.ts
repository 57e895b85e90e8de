import { outOfBounds, refused, type Refused } from '../../geometry/refusal';

/** A change over the same time, measured or predicted, with its uncertainty [mm]. */
export interface ChangeWithError {
  readonly changeMm: number;
  readonly sdMm: number;
}

export const PREDICTION_FINDINGS = [
  'faster than predicted',
  'as predicted',
  'slower than predicted',
  'not resolvable',
] as const;
export type PredictionFinding = (typeof PREDICTION_FINDINGS)[number];

/** Measured growth against the growth the assessment in force predicted. */
export interface PredictionComparison {
  readonly status: 'compared';
  /** Measured less predicted, in standard deviations of their difference. */
  readonly z: number;
  readonly differenceMm: number;
  readonly differenceSdMm: number;
  readonly finding: PredictionFinding;
  /** In words, with what follows from it. */
  readonly words: string;
}

// two-sided 90 %: a false alarm in one of ten comparisons is cheaper than a fast flaw unseen (common practice)
const Z = 1.645;

const FOLLOWS: Readonly<Record<PredictionFinding, string>> = {
  'faster than predicted':
    'The flaw grew faster than predicted: the assessment no longer holds; review the mechanism and bring the next inspection forward.',
  'as predicted': 'The change agrees with the prediction.',
  'slower than predicted':
    'The flaw grew more slowly than predicted: keep the law, one good result does not lengthen the interval; check that it is the same flaw.',
  'not resolvable':
    'The sizing error is larger than the predicted change: the measurement neither confirms nor contradicts the prediction.',
};

/** Compares a measured with a predicted change over the same time. */
export function compareWithPrediction(
  measured: ChangeWithError,
  predicted: ChangeWithError,
): PredictionComparison | Refused {
  const refusals = outOfBounds([
    change('measured.changeMm', 'Measured change', measured.changeMm, -1000),
    { ...change('measured.sdMm', 'Error of the measured change', measured.sdMm), above: true },
    change('predicted.changeMm', 'Predicted change', predicted.changeMm),
    change('predicted.sdMm', 'Error of the predicted change', predicted.sdMm),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const differenceMm = measured.changeMm - predicted.changeMm;
  const differenceSdMm = Math.hypot(measured.sdMm, predicted.sdMm);
  const z = differenceMm / differenceSdMm;
  const finding: PredictionFinding =
    z >= Z
      ? 'faster than predicted'
      : z <= -Z
        ? 'slower than predicted'
        : measured.sdMm > predicted.changeMm
          ? 'not resolvable'
          : 'as predicted';
  const numbers = `Measured ${measured.changeMm.toFixed(2)} mm, predicted ${predicted.changeMm.toFixed(2)} mm (z = ${z.toFixed(1)}).`;
  return {
    status: 'compared',
    z,
    differenceMm,
    differenceSdMm,
    finding,
    words: `${FOLLOWS[finding]} ${numbers}`,
  };
}

const change = (input: string, name: string, value: number, min = 0) => ({
  input,
  name,
  unit: 'mm',
  value,
  min,
  max: 1000,
  instead: 'Give the change over the time between the two findings, in millimetres.',
});
