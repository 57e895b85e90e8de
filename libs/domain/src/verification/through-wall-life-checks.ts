import { secantFactor } from '../fracture/stress-intensity/centre-crack';
import { integrateGrowth } from '../growth/integrate-growth';
import { growthPerCycle } from '../growth/growth-law';
import type { CheckRow } from './check-row';

// a crack through a plate 400 mm wide, half length 15 mm, in tension
const WIDTH = 400;
const START = 15;
const k = (half: number, stress: number) =>
  stress * Math.sqrt(Math.PI * half) * secantFactor((2 * half) / WIDTH);

/** Cycles of 100 MPa from the first to the last half length under a Paris law. */
function cyclesTo(last: number): number {
  const perCycle = growthPerCycle({
    stages: [{ coefficient: 5.21e-13, exponent: 3 }],
    thresholdMPaSqrtMm: 0,
  });
  const run = integrateGrowth(
    { a: START, c: START },
    (a, _c, into) => {
      into.a = perCycle(k(a, 100));
      into.c = into.a;
    },
    [{ key: 'length', margin: (a) => last - a }],
    { horizonYears: 1e9, tolerance: 1e-10 },
  );
  return run.states[run.states.length - 1]?.years ?? Number.NaN;
}

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckRow['kind'],
  compute: () => number,
): CheckRow => ({
  id,
  group: 'End to end',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source: 'the whole case computed with a separate program, two methods each',
  compute,
});

export const THROUGH_WALL_LIFE_CHECKS: readonly CheckRow[] = [
  row(
    'E3-1',
    'K of a crack through a plate',
    32.6754991948669,
    'MPa·√m',
    1e-9,
    'closed form',
    () => k(START, 150) / Math.sqrt(1000),
  ),
  row(
    'E3-2',
    'cycles from 15 to 80.82 mm',
    94482.61118224793,
    'cycles',
    1e-8,
    'independent computation',
    () => cyclesTo(80.82152372394307),
  ),
];
