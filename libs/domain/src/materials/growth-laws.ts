import type { FatigueLawInput } from '../assessment/assessment-input';

/** A law of the library with what it may be chosen by. */
export interface LibraryLaw extends FatigueLawInput {
  readonly environment: string;
  /** Stress ratio it holds for; welds take R ≥ 0.5 for their residual tension. */
  readonly stressRatio: 'R < 0.5' | 'R ≥ 0.5' | 'any';
  readonly curve: 'mean' | 'mean + 2 SD' | 'upper';
}

const TABLE = 'BS 7910:2013 two-stage table, steels';
const MEMORY = `${TABLE} (from memory; the stages meet at the tabulated transition within 0.4 %)`;
const CONFIRMED = `${TABLE} (from memory; means confirmed by JCSS Probabilistic Model Code Part 3.12, Table 3.1)`;
const SIMPLIFIED = 'BS 7910 simplified law (from memory; equals the value quoted by IIW)';

/** No threshold is claimed where the medium corrodes or the potential charges hydrogen; welds otherwise take 63. */
const WELD_THRESHOLD = 63;

const twoStage = (
  key: string,
  environment: string,
  stressRatio: LibraryLaw['stressRatio'],
  curve: LibraryLaw['curve'],
  row: readonly [a1: number, m1: number, a2: number, m2: number],
  source = MEMORY,
): LibraryLaw => ({
  key,
  environment,
  stressRatio,
  curve,
  title: `Steel, ${environment}, ${stressRatio}, ${curve}, two stages`,
  source,
  stages: [
    { coefficient: row[0], exponent: row[1] },
    { coefficient: row[2], exponent: row[3] },
  ],
  thresholdMPaSqrtMm: environment === 'air' ? WELD_THRESHOLD : 0,
});

/** The library of fatigue laws: da/dN in mm/cycle, ΔK in MPa·√mm. */
export const GROWTH_LAWS: readonly LibraryLaw[] = [
  twoStage('steel-air-low-mean', 'air', 'R < 0.5', 'mean', [1.21e-26, 8.16, 3.98e-13, 2.88]),
  twoStage(
    'steel-air-low-upper',
    'air',
    'R < 0.5',
    'mean + 2 SD',
    [4.37e-26, 8.16, 6.77e-13, 2.88],
  ),
  twoStage(
    'steel-air-high-mean',
    'air',
    'R ≥ 0.5',
    'mean',
    [4.8e-18, 5.1, 5.86e-13, 2.88],
    CONFIRMED,
  ),
  twoStage('steel-air-high-upper', 'air', 'R ≥ 0.5', 'mean + 2 SD', [2.1e-17, 5.1, 1.29e-12, 2.88]),
  twoStage(
    'steel-marine-free-low-mean',
    'marine, free corrosion',
    'R < 0.5',
    'mean',
    [3e-14, 3.42, 1.27e-7, 1.3],
  ),
  twoStage(
    'steel-marine-free-low-upper',
    'marine, free corrosion',
    'R < 0.5',
    'mean + 2 SD',
    [8.55e-14, 3.42, 1.93e-7, 1.3],
  ),
  twoStage(
    'steel-marine-free-high-mean',
    'marine, free corrosion',
    'R ≥ 0.5',
    'mean',
    [5.37e-14, 3.42, 5.67e-7, 1.11],
    CONFIRMED,
  ),
  twoStage(
    'steel-marine-free-high-upper',
    'marine, free corrosion',
    'R ≥ 0.5',
    'mean + 2 SD',
    [1.72e-13, 3.42, 7.48e-7, 1.11],
  ),
  twoStage(
    'steel-marine-cp850-low-mean',
    'marine, protected at −850 mV',
    'R < 0.5',
    'mean',
    [1.21e-26, 8.16, 5.16e-12, 2.67],
  ),
  twoStage(
    'steel-marine-cp850-low-upper',
    'marine, protected at −850 mV',
    'R < 0.5',
    'mean + 2 SD',
    [4.37e-26, 8.16, 1.32e-11, 2.67],
  ),
  twoStage(
    'steel-marine-cp850-high-mean',
    'marine, protected at −850 mV',
    'R ≥ 0.5',
    'mean',
    [4.8e-18, 5.1, 6e-12, 2.67],
  ),
  twoStage(
    'steel-marine-cp850-high-upper',
    'marine, protected at −850 mV',
    'R ≥ 0.5',
    'mean + 2 SD',
    [2.1e-17, 5.1, 2.02e-11, 2.67],
  ),
  twoStage(
    'steel-marine-cp1100-low-mean',
    'marine, protected at −1100 mV',
    'R < 0.5',
    'mean',
    [1.21e-26, 8.16, 5.51e-8, 1.4],
  ),
  twoStage(
    'steel-marine-cp1100-low-upper',
    'marine, protected at −1100 mV',
    'R < 0.5',
    'mean + 2 SD',
    [4.37e-26, 8.16, 9.24e-8, 1.4],
  ),
  twoStage(
    'steel-marine-cp1100-high-mean',
    'marine, protected at −1100 mV',
    'R ≥ 0.5',
    'mean',
    [4.8e-18, 5.1, 5.25e-8, 1.4],
  ),
  twoStage(
    'steel-marine-cp1100-high-upper',
    'marine, protected at −1100 mV',
    'R ≥ 0.5',
    'mean + 2 SD',
    [2.1e-17, 5.1, 1.02e-7, 1.4],
  ),
  {
    key: 'steel-air-simplified',
    environment: 'air',
    stressRatio: 'any',
    curve: 'upper',
    title: 'Steel, air to 100 °C, simplified',
    source: SIMPLIFIED,
    stages: [{ coefficient: 5.21e-13, exponent: 3 }],
    thresholdMPaSqrtMm: WELD_THRESHOLD,
  },
  {
    key: 'steel-marine-simplified',
    environment: 'marine, free corrosion',
    stressRatio: 'any',
    curve: 'upper',
    title: 'Steel, sea water to 20 °C, simplified',
    source: SIMPLIFIED,
    stages: [{ coefficient: 2.3e-12, exponent: 3 }],
    thresholdMPaSqrtMm: 0,
  },
];

/** The law of a key, or undefined when the library has none. */
export const growthLaw = (key: string): LibraryLaw | undefined =>
  GROWTH_LAWS.find((law) => law.key === key);
