/** Probabilities of failure a column of the table is for. */
export const TARGET_PROBABILITIES = [0.23, 1e-3, 7e-5, 1e-5] as const;
export type TargetProbability = (typeof TARGET_PROBABILITIES)[number];

/** What a factor acts on. */
export const FACTORED = ['stress', 'size', 'toughness', 'yield'] as const;
export type Factored = (typeof FACTORED)[number];

/** One row: the factors on one input of one scatter, in the order of the target probabilities. */
export interface PartialFactorRow {
  readonly on: Factored;
  /** Coefficient of variation of the input. */
  readonly variation: number;
  readonly factors: readonly [number, number, number, number];
  readonly source: string;
}

const ANNEX_K = 'BS 7910 Annex K (from memory; check against a bought copy)';
const row = (
  on: Factored,
  variation: number,
  ...factors: PartialFactorRow['factors']
): PartialFactorRow => ({ on, variation, factors, source: ANNEX_K });

/** Recommended factors; a site may put its own table in their place. */
export const PARTIAL_FACTORS: readonly PartialFactorRow[] = [
  row('stress', 0.1, 1.05, 1.2, 1.25, 1.3),
  row('stress', 0.2, 1.1, 1.25, 1.35, 1.4),
  row('stress', 0.3, 1.12, 1.4, 1.5, 1.6),
  row('size', 0.1, 1, 1.4, 1.5, 1.7),
  row('size', 0.2, 1.05, 1.45, 1.55, 1.8),
  row('size', 0.3, 1.08, 1.5, 1.65, 1.9),
  row('toughness', 0.1, 1, 1.3, 1.5, 1.7),
  row('toughness', 0.2, 1, 1.8, 2.6, 3.2),
  row('yield', 0.1, 1, 1.05, 1.1, 1.2),
];
