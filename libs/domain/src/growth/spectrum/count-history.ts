import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import { rainflowCounter, type CountedCycle } from './rainflow';

/** Stresses in the order of time [MPa]. */
export type History = readonly number[] | Float64Array;

/** A history as counted cycles, in the order in which they close. */
export interface CountedHistory {
  readonly status: 'counted';
  readonly cycles: readonly CountedCycle[];
}

const LARGEST_STRESS = 1e5;

/** Counts a stress history by rainflow; refuses what is no history. */
export function countHistory(
  history: History,
  { deadBandMPa = 0 }: { readonly deadBandMPa?: number } = {},
): CountedHistory | Refused {
  const broken = [...bandRefusals(deadBandMPa), ...historyRefusals(history)];
  if (broken.length > 0) return refused(...broken);
  const cycles: CountedCycle[] = [];
  const counter = rainflowCounter((cycle) => cycles.push(cycle), { deadBand: deadBandMPa });
  for (const value of history) counter.push(value);
  counter.end();
  return cycles.length > 0 ? { status: 'counted', cycles } : refused(constant(deadBandMPa));
}

const bandRefusals = (deadBandMPa: number): readonly Refusal[] =>
  outOfBounds([
    {
      input: 'deadBandMPa',
      name: 'Dead band',
      unit: 'MPa',
      value: deadBandMPa,
      min: 0,
      max: LARGEST_STRESS,
      instead: 'Give the smallest swing that is to count, or 0 to count all.',
    },
  ]);

function historyRefusals(history: History): readonly Refusal[] {
  if (history.length < 2) return [tooShort(history.length)];
  for (let i = 0; i < history.length; i++) {
    const value = history[i] ?? Number.NaN;
    if (Math.abs(value) <= LARGEST_STRESS) continue;
    return outOfBounds([
      {
        input: `history.${i}`,
        name: `Value ${i + 1} of the history`,
        unit: 'MPa',
        value,
        min: -LARGEST_STRESS,
        max: LARGEST_STRESS,
        instead: 'Give every value in MPa and leave out what was not measured.',
      },
    ]);
  }
  return [];
}

const tooShort = (length: number): Refusal => ({
  input: 'history',
  limit: 'at least 2 values',
  value: length,
  message: `The history holds ${length} value${length === 1 ? '' : 's'}; a range needs two.`,
  instead: 'Give the stresses in the order of time.',
});

const constant = (deadBandMPa: number): Refusal => ({
  input: 'history',
  limit: `a swing above ${deadBandMPa} MPa`,
  value: 0,
  message: 'The history never swings by more than the dead band: there is no cycle in it.',
  instead: 'Choose a smaller dead band, or leave fatigue out.',
});
