/** Scatter of a quantity as a published model code gives it. */
export interface TypicalScatter {
  readonly key: string;
  readonly quantity: string;
  readonly distribution: 'lognormal';
  /** Mean where the source gives one, in the unit named. */
  readonly mean: { readonly value: number; readonly unit: string } | null;
  readonly cov: number;
  readonly source: string;
  /** What the reader must know before using it. */
  readonly caution: string | null;
}

const STEEL = 'JCSS Probabilistic Model Code Part 3.2, structural steel';
const FATIGUE = 'JCSS Probabilistic Model Code Part 3.12, fatigue, Table 3.1';
const TWICE =
  'About twice what the mean and mean + 2 SD curves of BS 7910 imply; it may be two standard deviations. Prefer the scatter between the curves.';

type Row = readonly [
  key: string,
  quantity: string,
  mean: TypicalScatter['mean'],
  cov: number,
  source: string,
  caution?: string,
];

const of = (value: number, unit: string) => ({ value, unit });

const ROWS: readonly Row[] = [
  ['yield', 'Yield strength of structural steel', null, 0.07, STEEL],
  ['paris-air-low', 'Growth coefficient, air, lower stage', null, 1.7, FATIGUE, TWICE],
  ['paris-air-high', 'Growth coefficient, air, upper stage', null, 0.6, FATIGUE, TWICE],
  ['paris-marine-low', 'Growth coefficient, marine, lower stage', null, 1.1, FATIGUE],
  ['paris-marine-high', 'Growth coefficient, marine, upper stage', null, 0.16, FATIGUE],
  ['initial-depth', 'Initial depth, sound welds', of(0.15, 'mm'), 0.66, FATIGUE],
  ['initial-aspect', 'Initial aspect ratio a/c', of(0.62, ''), 0.4, FATIGUE],
  ['miner-sum', 'Miner sum at failure', of(1, ''), 0.3, FATIGUE],
  ['residual-stress', 'Residual stress', of(300, 'MPa'), 0.2, FATIGUE],
  ['stress-intensity-by-hand', 'Stress intensity model, by hand', of(1, ''), 0.2, FATIGUE],
  [
    'stress-intensity-by-elements',
    'Stress intensity model, finite elements',
    of(1, ''),
    0.07,
    FATIGUE,
  ],
  ['threshold', 'Growth threshold, air', of(140, 'MPa·√mm'), 0.4, FATIGUE],
];

/** Typical scatter of the inputs of a crack assessment; a starting point, never better than own data. */
export const TYPICAL_SCATTER: readonly TypicalScatter[] = ROWS.map(
  ([key, quantity, mean, cov, source, caution = null]) => ({
    key,
    quantity,
    distribution: 'lognormal',
    mean,
    cov,
    source,
    caution,
  }),
);
