import { PLATE_SURFACE_K } from '../fracture/stress-intensity/plate-surface-k';
import type { GrowthLaw } from '../growth/growth-law';
import { ratesPerYear } from '../growth/growth-rates';
import { integrateGrowth } from '../growth/integrate-growth';
import type { CheckRow } from './check-row';
import { kOf } from './crack-of';
import { growthRow as row } from './growth-row';

/** Cycles from a0 to a1 with K = Y ΔS √(πa), one cycle counted as a year. */
function cyclesTo(
  a0: number,
  a1: number,
  law: GrowthLaw,
  ranges: readonly (readonly [range: number, count: number])[],
  y: number,
): number {
  let size = a0;
  const k = (range: number) => y * range * Math.sqrt(Math.PI * size);
  const blocks = ranges.map(([range, count]) => ({
    membraneRangeMPa: range,
    bendingRangeMPa: 0,
    cyclesPerYear: count,
  }));
  const perYear = ratesPerYear(
    { fatigue: { law, blocks }, stressCorrosion: null },
    { deepest: k, end: () => 0 },
  );
  const run = integrateGrowth(
    { a: a0, c: 10 * a1 },
    (a, _c, into) => {
      size = a;
      perYear(into);
    },
    [{ key: 'end', margin: (a) => a1 - a }],
    { horizonYears: 1e12 },
  );
  return run.states[run.states.length - 1]?.years ?? Number.NaN;
}

const paris = (coefficient: number, exponent: number): GrowthLaw => ({
  stages: [{ coefficient, exponent }],
  thresholdMPaSqrtMm: 0,
});
const CLOSED = 'closed form of the Paris law at constant shape factor';

/** Surface flaw in a plate grown by two coupled rates to a = 20 mm. */
function surfaceGrowth(): { readonly cycles: number; readonly c: number } {
  let [depth, half] = [2, 5];
  const k = (angle: number) => (range: number) =>
    kOf(PLATE_SURFACE_K, { a: depth, c: half, t: 25, W: 400 }, angle, range);
  const blocks = [{ membraneRangeMPa: 100, bendingRangeMPa: 0, cyclesPerYear: 1 }];
  const perYear = ratesPerYear(
    { fatigue: { law: paris(5.21e-13, 3), blocks }, stressCorrosion: null },
    { deepest: k(90), end: k(0) },
  );
  const run = integrateGrowth(
    { a: 2, c: 5 },
    (a, c, into) => {
      [depth, half] = [a, c];
      perYear(into);
    },
    [{ key: 'end', margin: (a) => 20 - a }],
    { horizonYears: 1e12 },
  );
  const last = run.states[run.states.length - 1];
  return { cycles: last?.years ?? Number.NaN, c: last?.c ?? Number.NaN };
}

const superposed = () => {
  const into = { a: 0, c: 0 };
  const blocks = [{ membraneRangeMPa: 1, bendingRangeMPa: 0, cyclesPerYear: 2000 }];
  ratesPerYear(
    {
      fatigue: { law: paris(1e-4, 1), blocks },
      stressCorrosion: { depthRateMmPerYear: 0.15, endRateMmPerYear: 0 },
    },
    { deepest: () => 1, end: () => 1 },
  )(into);
  return into.a;
};

const CLOSED_FORMS = [
  [3, 5.21e-13, 1.12, 463_382.7876389821],
  [2, 1e-10, 1, 1_145_211.873249106],
  [4, 1e-15, 1, 1_113_147.769508105],
] as const;
const closed = CLOSED_FORMS.map(([m, coefficient, y, cycles], i) =>
  row(
    `GL-${i + 1}`,
    `cycles from 2 to 20 mm, m = ${m}`,
    cycles,
    'cycles',
    1e-5,
    'closed form',
    CLOSED,
    () => cyclesTo(2, 20, paris(coefficient, m), [[80, 1]], y),
  ),
);

export const GROWTH_LIFE_CHECKS: readonly CheckRow[] = [
  ...closed,
  row(
    'GL-4',
    'years of a three-block spectrum from 2 to 20 mm',
    179.0851353194135,
    'years',
    1e-5,
    'closed form',
    'equivalent range of the blocks',
    () =>
      cyclesTo(
        2,
        20,
        paris(5.21e-13, 3),
        [
          [120, 100],
          [80, 1000],
          [40, 10_000],
        ],
        1.12,
      ),
  ),
  row(
    'GS-1',
    'surface flaw 2 × 10 in a 25 mm plate: cycles to a = 20 mm',
    593_976,
    'cycles',
    1e-5,
    'independent computation',
    'two other integrators, agreeing to 1e-9',
    () => surfaceGrowth().cycles,
  ),
  row(
    'GS-2',
    'half length then',
    25.72720622342391,
    'mm',
    1e-5,
    'independent computation',
    'two other integrators, agreeing to 1e-9',
    () => surfaceGrowth().c,
  ),
  row(
    'GC-1',
    'fatigue and stress corrosion added: 2000 · 10⁻⁴ + 0.15',
    0.35,
    'mm/year',
    1e-9,
    'closed form',
    'Wei and Landes',
    superposed,
  ),
];
