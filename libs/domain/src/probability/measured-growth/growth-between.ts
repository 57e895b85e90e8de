import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { normalQuantile } from '../../numerics/normal-distribution';
import { judgeRate, type JudgedRate } from './judge-growth';
import { refusalsOfFindings, type SizedFinding } from './sized-finding';

/** Growth between two findings of the same flaw, judged against the two sizing errors. */
export interface MeasuredGrowth extends JudgedRate {
  readonly status: 'measured';
  readonly changeMm: number;
  readonly changeSdMm: number;
  /** Change that would just be shown to be real [mm]. */
  readonly resolvableMm: number;
}

export interface ComparisonOptions {
  /** Largest chance of calling growth real when there is none, one-sided. */
  readonly level?: number;
  /** Standard deviation of the difference between two techniques; 0 when the same was used [mm]. */
  readonly techniqueSdMm?: number;
}

/** The usual one-sided level. */
export const LEVEL = 0.05;

/** Growth from an earlier to a later finding. */
export function growthBetween(
  earlier: SizedFinding,
  later: SizedFinding,
  { level = LEVEL, techniqueSdMm = 0 }: ComparisonOptions = {},
): MeasuredGrowth | Refused {
  const refusals = [
    ...refusalsOfFindings([earlier, later], 2),
    ...outOfBounds([
      levelRule(level),
      {
        input: 'techniqueSdMm',
        name: 'Difference between techniques',
        unit: 'mm',
        value: techniqueSdMm,
        min: 0,
        max: 1000,
        instead: 'Give it in millimetres; 0 when the same technique was used.',
      },
    ]),
  ];
  if (refusals.length > 0) return refused(...refusals);
  const years = later.years - earlier.years;
  const changeMm = later.sizeMm - earlier.sizeMm;
  const changeSdMm = Math.hypot(earlier.sizingSdMm, later.sizingSdMm, techniqueSdMm);
  return {
    status: 'measured',
    changeMm,
    changeSdMm,
    resolvableMm: -normalQuantile(level) * changeSdMm,
    ...judgeRate(changeMm / years, changeSdMm / years, level),
  };
}

/** Bounds of a one-sided level. */
export const levelRule = (level: number) => ({
  input: 'level',
  name: 'Level of the test',
  unit: '',
  value: level,
  min: 0,
  max: 0.5,
  above: true,
  instead: 'Give the chance of a false alarm as a share: 5 % is 0.05.',
});
