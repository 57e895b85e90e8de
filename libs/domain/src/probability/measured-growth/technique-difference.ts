import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { normalBelow } from '../../numerics/normal-distribution';
import type { ChangeWithError } from './compare-with-prediction';

/** Whether one inspection sizes larger than another, from flaws that are not expected to grow. */
export interface TechniqueDifference {
  readonly status: 'compared';
  /** Later less earlier size, weighted by the sizing errors [mm]. */
  readonly meanMm: number;
  readonly meanSdMm: number;
  /** Chance of a mean this far from 0 when both size alike (two-sided). */
  readonly chanceWhenAlike: number;
  readonly systematic: boolean;
  /** In words, for a person. */
  readonly words: string;
}

const LEVEL = 0.05;
const FEWEST = 3;

/** Mean change of flaws expected to be static: it should be 0, otherwise it is the technique that changed. */
export function techniqueDifference(
  changes: readonly ChangeWithError[],
): TechniqueDifference | Refused {
  const refusals = outOfBounds(rulesOf(changes));
  if (refusals.length > 0) return refused(...refusals);
  const weights = changes.map(({ sdMm }) => 1 / (sdMm * sdMm));
  const all = weights.reduce((sum, weight) => sum + weight, 0);
  const meanMm =
    changes.reduce((sum, { changeMm }, i) => sum + (weights[i] as number) * changeMm, 0) / all;
  const meanSdMm = 1 / Math.sqrt(all);
  const chanceWhenAlike = 2 * normalBelow(-Math.abs(meanMm) / meanSdMm);
  const systematic = chanceWhenAlike < LEVEL;
  const numbers = `${meanMm.toFixed(2)} ± ${meanSdMm.toFixed(2)} mm over ${changes.length} flaws`;
  return {
    status: 'compared',
    meanMm,
    meanSdMm,
    chanceWhenAlike,
    systematic,
    words: systematic
      ? `The later inspection sizes differently (${numbers}): correct for it before growth is judged.`
      : `No systematic difference between the two inspections (${numbers}).`,
  };
}

const rulesOf = (changes: readonly ChangeWithError[]): readonly NumberRule[] => [
  {
    input: 'changes',
    name: 'Number of re-measured flaws',
    unit: '',
    value: changes.length,
    min: FEWEST,
    max: 1e6,
    instead: 'Use more flaws that are not expected to grow.',
  },
  ...changes.flatMap(({ changeMm, sdMm }, i) => [
    {
      input: `changes.${i}.changeMm`,
      name: 'Change',
      unit: 'mm',
      value: changeMm,
      min: -1000,
      max: 1000,
      instead: 'Give it in millimetres.',
    },
    {
      input: `changes.${i}.sdMm`,
      name: 'Error of the change',
      unit: 'mm',
      value: sdMm,
      min: 0,
      max: 1000,
      above: true,
      instead: 'Give the standard deviation of the change in millimetres.',
    },
  ]),
];
