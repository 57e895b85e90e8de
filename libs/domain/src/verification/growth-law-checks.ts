import { growthPerCycle, transition } from '../growth/growth-law';
import { GROWTH_LAWS, growthLaw } from '../materials/growth-laws';
import { airThreshold } from '../materials/growth-threshold';
import type { CheckRow } from './check-row';
import { growthRow as row } from './growth-row';

const TABLE =
  'BS 7910:2013 two-stage table (constants and transition both from memory; their agreement is the check)';

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

const THRESHOLDS = [
  [0.25, 116.5],
  [0, 170],
  [-0.5, 170],
] as const;
const thresholds = THRESHOLDS.map(([ratio, threshold], i) =>
  row(
    `GH-${i + 1}`,
    `threshold at R = ${ratio}`,
    threshold,
    'MPa·√mm',
    1e-9,
    'from memory',
    'BS 7910, IIW (from memory)',
    () => airThreshold(ratio),
  ),
);

export const GROWTH_LAW_CHECKS: readonly CheckRow[] = [...transitions, ...rates, ...thresholds];
