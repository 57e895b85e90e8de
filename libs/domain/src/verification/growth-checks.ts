import { growthPerCycle, transition, type GrowthLaw } from '../growth/growth-law';
import { ratesPerYear } from '../growth/growth-rates';
import { integrateGrowth } from '../growth/integrate-growth';
import { GROWTH_LAWS, growthLaw } from '../materials/growth-laws';
import { airThreshold } from '../materials/growth-threshold';
import type { CheckKind, CheckRow } from './check-row';
import { PLATE_SURFACE_K } from '../fracture/stress-intensity/plate-surface-k';
import { kOf } from './crack-of';

const TABLE =
  'BS 7910:2013 two-stage table (constants and transition both from memory; their agreement is the check)';

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Crack growth',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

/** Tabulated transitions in the order of the library's two-stage laws [MPa·√mm]. */
const TRANSITIONS = [
  363, 315, 196, 144, 1336, 993, 1098, 748, 462, 434, 323, 290, 576, 514, 517, 415,
];

const transitions = GROWTH_LAWS.filter(({ stages }) => stages.length === 2).map(
  ({ title, stages: [lower, upper] }, i) =>
    row(
      `GT-${i + 1}`,
      `transition: ${title}`,
      TRANSITIONS[i] ?? 0,
      'MPa·√mm',
      0.004,
      'from memory',
      TABLE,
      () => (lower && upper ? transition(lower, upper) : Number.NaN),
    ),
);

const UPPER = growthLaw('steel-air-high-upper');
const rateAt = (range: number) =>
  UPPER ? growthPerCycle({ ...UPPER, thresholdMPaSqrtMm: 0 })(range) : Number.NaN;
const RATES = [
  [80, 1.06654265306366e-7],
  [144, 2.121649735509455e-6],
  [300, 1.756705349841104e-5],
  [1000, 0.0005631054235898137],
] as const;
const rates = RATES.map(([range, rate], i) =>
  // the table's rounded transition (144) and the exact meeting point (143.6) lie 0.4 % apart
  row(
    `GR-${i + 1}`,
    `da/dN at ΔK = ${range}, air, R ≥ 0.5, mean + 2 SD`,
    rate,
    'mm/cycle',
    range === 144 ? 0.01 : 1e-9,
    'from memory',
    TABLE,
    () => rateAt(range),
  ),
);

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

export const GROWTH_CHECKS: readonly CheckRow[] = [
  ...transitions,
  ...rates,
  row(
    'GH-1',
    'threshold at R = 0.25',
    116.5,
    'MPa·√mm',
    1e-9,
    'from memory',
    'BS 7910, IIW (from memory)',
    () => airThreshold(0.25),
  ),
  row(
    'GH-2',
    'threshold at R = 0',
    170,
    'MPa·√mm',
    1e-9,
    'from memory',
    'BS 7910, IIW (from memory)',
    () => airThreshold(0),
  ),
  row(
    'GH-3',
    'threshold at R = −0.5',
    170,
    'MPa·√mm',
    1e-9,
    'from memory',
    'BS 7910, IIW (from memory)',
    () => airThreshold(-0.5),
  ),
  row(
    'GL-1',
    'cycles from 2 to 20 mm, m = 3',
    463_382.7876389821,
    'cycles',
    1e-5,
    'closed form',
    CLOSED,
    () => cyclesTo(2, 20, paris(5.21e-13, 3), [[80, 1]], 1.12),
  ),
  row(
    'GL-2',
    'cycles from 2 to 20 mm, m = 2',
    1_145_211.873249106,
    'cycles',
    1e-5,
    'closed form',
    CLOSED,
    () => cyclesTo(2, 20, paris(1e-10, 2), [[80, 1]], 1),
  ),
  row(
    'GL-3',
    'cycles from 2 to 20 mm, m = 4',
    1_113_147.769508105,
    'cycles',
    1e-5,
    'closed form',
    CLOSED,
    () => cyclesTo(2, 20, paris(1e-15, 4), [[80, 1]], 1),
  ),
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
