import { PLATE_SURFACE_K } from '../fracture/stress-intensity/plate-surface-k';
import { ratesPerYear } from '../growth/growth-rates';
import { integrateGrowth, type GrowthRun } from '../growth/integrate-growth';
import { throughWallHalfLength } from '../growth/recategorise';
import type { CheckRow } from './check-row';
import { kOf } from './crack-of';
import { growthRow as row } from './growth-row';

const law = { stages: [{ coefficient: 5.21e-13, exponent: 3 }], thresholdMPaSqrtMm: 0 };
const blocks = [{ membraneRangeMPa: 100, bendingRangeMPa: 0, cyclesPerYear: 1 }];
const fatigue = { law, blocks };
// tight, as the values stand for more digits than an assessment needs
const TIGHT = { horizonYears: 1e12, tolerance: 1e-10 };
const [WALL, WIDTH] = [25, 400];
const DEEPEST = 90;
const SURFACE = 0;

const symbols = (a: number, c: number) => ({ a, c, t: WALL, W: WIDTH });
const lastOf = ({ states }: GrowthRun) => states[states.length - 1];

/** A surface flaw of 2 × 10 mm to 0.8 of the wall, one cycle a year. */
function surface() {
  let [depth, half] = [2, 5];
  const k = (angle: number) => (range: number) =>
    kOf(PLATE_SURFACE_K, symbols(depth, half), angle, range);
  const perYear = ratesPerYear(
    { fatigue, stressCorrosion: null },
    { deepest: k(DEEPEST), end: k(SURFACE) },
  );
  const run = integrateGrowth(
    { a: depth, c: half },
    (a, c, into) => {
      [depth, half] = [a, c];
      perYear(into);
    },
    [{ key: 'end', margin: (a) => 0.8 * WALL - a }],
    TIGHT,
  );
  return lastOf(run);
}

/** The flaw through the wall it becomes, to a half length of 80 mm, Y = √sec(πa/W). */
function throughWall(from: number) {
  let half = from;
  const k = (range: number) =>
    range * Math.sqrt((Math.PI * half) / Math.cos((Math.PI * half) / WIDTH));
  const perYear = ratesPerYear({ fatigue, stressCorrosion: null }, { deepest: k, end: () => 0 });
  const run = integrateGrowth(
    { a: half, c: half },
    (a, _c, into) => {
      half = a;
      perYear(into);
    },
    [{ key: 'end', margin: (a) => 80 - a }],
    TIGHT,
  );
  return lastOf(run)?.years ?? Number.NaN;
}

const whole = () => {
  const end = surface();
  if (!end) return Number.NaN;
  return end.years + throughWall(throughWallHalfLength(end.a, end.c, WALL));
};
const shape = (angle: number) =>
  kOf(PLATE_SURFACE_K, symbols(5, 10), angle, 1) / Math.sqrt(Math.PI * 5);

const TWO = 'two other integrators, agreeing to 1e-9';
const PAPER = 'JCSS Probabilistic Model Code Part 3.12, Annex A (Newman and Raju), another program';
const VALUES: readonly (readonly [string, number, string, number, string, () => number])[] = [
  [
    'surface flaw 5 × 20 in a 25 mm plate: shape factor at the deepest point',
    0.9199186855917573,
    '-',
    1e-9,
    PAPER,
    () => shape(DEEPEST),
  ],
  ['the same at the surface', 0.724635545164472, '-', 1e-9, PAPER, () => shape(SURFACE)],
  [
    'surface flaw 2 × 10 grown to 0.8 of the wall: half length',
    25.72720622342391,
    'mm',
    1e-7,
    TWO,
    () => surface()?.c ?? Number.NaN,
  ],
  ['its aspect then', 0.7773871685216466, '-', 1e-7, TWO, () => 20 / (surface()?.c ?? Number.NaN)],
  [
    'half length through the wall',
    30.72720622342391,
    'mm',
    1e-9,
    'c + (t − a), API 579-1 form (from memory)',
    () => throughWallHalfLength(20, 25.72720622342391, WALL),
  ],
  [
    'cycles through the wall from there to 80 mm',
    41_748.85836480799,
    'cycles',
    1e-8,
    TWO,
    () => throughWall(30.727206223),
  ],
  [
    'cycles from the surface flaw to 80 mm through the wall',
    635_725.2003965451,
    'cycles',
    1e-7,
    TWO,
    whole,
  ],
];

export const GROWTH_SURFACE_CHECKS: readonly CheckRow[] = VALUES.map(
  ([quantity, published, unit, tolerance, source, compute], i) =>
    row(
      `GN-${i + 1}`,
      quantity,
      published,
      unit,
      tolerance,
      'independent computation',
      source,
      compute,
    ),
);
