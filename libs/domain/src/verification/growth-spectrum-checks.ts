import {
  cyclesThroughStages,
  sizeAtRange,
  sizeThroughStages,
} from '../growth/closed-form/stage-life';
import { blockByBlock } from '../growth/closed-form/block-by-block';
import { transition, type GrowthLaw } from '../growth/growth-law';
import { countHistory } from '../growth/spectrum/count-history';
import { equivalentRange, rangeSum } from '../growth/spectrum/equivalent-range';
import { rayleighMoment, weibullMoment } from '../growth/spectrum/range-moments';
import type { CountedCycle } from '../growth/spectrum/rainflow';
import { growthLaw } from '../materials/growth-laws';
import type { CheckRow } from './check-row';
import { growthRow as row } from './growth-row';

const STANDARD = 'ASTM E1049-85, example history, as in the test data of an open rainflow library';
const HISTORY = [-2, 1, -3, 5, -1, 3, -4, 4, -2];

function counted(history: readonly number[]): readonly CountedCycle[] {
  const outcome = countHistory(history);
  return outcome.status === 'counted' ? outcome.cycles : [];
}
const cyclesOfRange = (range: number) =>
  counted(HISTORY)
    .filter((cycle) => cycle.range === range)
    .reduce((sum, { count }) => sum + count, 0);

const COUNTS = [
  [3, 0.5],
  [4, 1.5],
  [6, 0.5],
  [8, 1],
  [9, 0.5],
] as const;
const counts = COUNTS.map(([range, count], i) =>
  row(
    `GW-${i + 1}`,
    `rainflow: cycles of range ${range}`,
    count,
    'cycles',
    0,
    'published table',
    STANDARD,
    () => cyclesOfRange(range),
  ),
);

const MEANS_IN_ORDER = [-1, -0.5, -1, 1, 1, 0.5];
const order = MEANS_IN_ORDER.map((mean, i) =>
  row(
    `GW-${i + 6}`,
    `rainflow from and to 0: mean of cycle ${i + 1}`,
    mean,
    '-',
    1e-9,
    'published table',
    STANDARD,
    () => counted([0, ...HISTORY, 0])[i]?.mean ?? Number.NaN,
  ),
);

const paris = (coefficient: number, exponent: number): GrowthLaw => ({
  stages: [{ coefficient, exponent }],
  thresholdMPaSqrtMm: 0,
});
const CLOSED = 'closed form of the Paris law at constant shape factor';
const LIVES = [
  [3, 5.21e-13, 1.12, 463_382.7876389821],
  [2, 1e-10, 1, 1_145_211.873249106],
  [4, 1e-15, 1, 1_113_147.769508105],
] as const;
const lives = LIVES.map(([m, coefficient, y, cycles], i) =>
  row(
    `GA-${i + 1}`,
    `closed form: cycles from 2 to 20 mm, m = ${m}`,
    cycles,
    'cycles',
    1e-9,
    'closed form',
    CLOSED,
    () => cyclesThroughStages(paris(coefficient, m), y * 80, [2, 20]),
  ),
);

const BLOCKS = [
  { rangeMPa: 120, count: 100 },
  { rangeMPa: 80, count: 1000 },
  { rangeMPa: 40, count: 10_000 },
];
const perProgramme = BLOCKS.reduce((sum, { count }) => sum + count, 0);
const steel = paris(5.21e-13, 3);

/** Programmes with the share of the last one, by what its blocks do. */
function steppedProgrammes(): number {
  const run = blockByBlock(steel, 1.12, BLOCKS, { fromMm: 2, toMm: 20 });
  const done = BLOCKS.map(({ rangeMPa, count }, i) => ({
    rangeMPa,
    count: i < run.block ? count : i === run.block ? run.cyclesOfBlock : 0,
  }));
  return run.programmes + rangeSum(done, 3) / rangeSum(BLOCKS, 3);
}

const meanInAir = growthLaw('steel-air-high-mean');
const sizeAtTransition = () => {
  const [lower, upper] = meanInAir?.stages ?? [];
  return lower && upper ? sizeAtRange(transition(lower, upper), 1.12 * 40) : Number.NaN;
};

export const GROWTH_SPECTRUM_CHECKS: readonly CheckRow[] = [
  ...counts,
  ...order,
  row(
    'GW-12',
    'rainflow: sum of n·range³',
    1094,
    '-',
    1e-9,
    'closed form',
    'sum over the counts above',
    () =>
      rangeSum(
        counted(HISTORY).map(({ range, count }) => ({ rangeMPa: range, count })),
        3,
      ),
  ),
  ...lives,
  row(
    'GA-4',
    'size after 500 000 cycles from 2 mm, m = 3',
    29.09249960003618,
    'mm',
    1e-9,
    'closed form',
    CLOSED,
    () => sizeThroughStages(steel, 1.12 * 80, 2, 500_000),
  ),
  row(
    'GA-5',
    'programmes of three blocks from 2 to 20 mm',
    179.0851353194135,
    'programmes',
    1e-9,
    'closed form',
    'equivalent range of the blocks',
    () => cyclesThroughStages(steel, 1.12 * equivalentRange(BLOCKS, 3), [2, 20]) / perProgramme,
  ),
  row(
    'GA-6',
    'the same stepped block by block',
    179.0851353194135,
    'programmes',
    1e-9,
    'closed form',
    'equivalent range of the blocks',
    steppedProgrammes,
  ),
  row(
    'GA-7',
    'size at which the two-stage mean in air (R ≥ 0.5) changes stage, 40 MPa, Y = 1.12',
    6.06551126158921,
    'mm',
    1e-9,
    'closed form',
    '(ΔK/(Y ΔS))²/π at the meeting point of the stages',
    sizeAtTransition,
  ),
  row(
    'GA-8',
    'Weibull ranges, k = 10, λ = 0.8: mean of ΔS³',
    16586.20653922594,
    'MPa³',
    1e-8,
    'closed form',
    'JCSS Probabilistic Model Code Part 3.12, Annex B1',
    () => weibullMoment(10, 0.8, 3),
  ),
  row(
    'GA-9',
    'Rayleigh ranges, s = 10: mean of ΔS²',
    800,
    'MPa²',
    1e-12,
    'closed form',
    '8 s², as the range is twice the amplitude',
    () => rayleighMoment(10, 2),
  ),
];
