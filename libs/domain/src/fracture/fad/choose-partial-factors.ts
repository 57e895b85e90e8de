import {
  outOfBounds,
  refused,
  type NumberRule,
  type Refusal,
  type Refused,
} from '../../geometry/refusal';
import {
  FACTORED,
  PARTIAL_FACTORS,
  TARGET_PROBABILITIES,
  type Factored,
  type PartialFactorRow,
  type TargetProbability,
} from './partial-factor-table';

/** Factors on stress and size, divisors of toughness and strength. */
export type PartialFactors = Readonly<Record<Factored, number>>;

/** The factors chosen, and the rows they were taken from. */
export interface ChosenFactors {
  readonly status: 'found';
  readonly factors: PartialFactors;
  readonly rows: readonly PartialFactorRow[];
}

/**
 * Factors for a target and the scatter of every input. Between two rows the one of the larger scatter is taken;
 * beyond the last row there is no factor.
 */
export function choosePartialFactors(
  target: TargetProbability,
  variations: Readonly<Record<Factored, number>>,
  table: readonly PartialFactorRow[] = PARTIAL_FACTORS,
): ChosenFactors | Refused {
  const column = TARGET_PROBABILITIES.indexOf(target);
  const found = FACTORED.map((on) => ({ on, row: rowFor(on, variations[on], table) }));
  const missing = found.flatMap(({ on, row }) => (row ? [] : [noRow(on, variations[on], table)]));
  if (column < 0) return refused(noColumn(target), ...missing);
  if (missing.length > 0) return refused(...missing);
  const rows = found.flatMap(({ row }) => (row ? [row] : []));
  const wrong = outOfBounds(rows.flatMap(rulesOf));
  if (wrong.length > 0) return refused(...wrong);
  const factorOn = (on: Factored) => rows.find((row) => row.on === on)?.factors[column] ?? 1;
  return {
    status: 'found',
    factors: {
      stress: factorOn('stress'),
      size: factorOn('size'),
      toughness: factorOn('toughness'),
      yield: factorOn('yield'),
    },
    rows,
  };
}

const rulesOf = ({ on, variation, factors }: PartialFactorRow): readonly NumberRule[] =>
  factors.map((value, i) => ({
    input: `partialFactors.table.${on}.${variation}.${i}`,
    name: `Factor on ${on}`,
    unit: '',
    value,
    min: 1,
    max: 10,
    instead: 'A partial factor is at least 1; 1 changes nothing.',
  }));

const rowFor = (on: Factored, variation: number, table: readonly PartialFactorRow[]) =>
  variation >= 0
    ? table
        .filter((row) => row.on === on && row.variation >= variation)
        .sort((a, b) => a.variation - b.variation)[0]
    : undefined;

function noRow(on: Factored, variation: number, table: readonly PartialFactorRow[]): Refusal {
  const last = Math.max(0, ...table.filter((row) => row.on === on).map((row) => row.variation));
  const limit = `from 0 to ${last}`;
  return {
    input: `partialFactors.${on}.variation`,
    limit,
    value: Number.isFinite(variation) ? variation : String(variation),
    message: `The coefficient of variation of ${on} is ${variation}; the table has factors ${limit}.`,
    instead: 'Enter a factor of your own with its reason, or compute the probability itself.',
  };
}

const noColumn = (target: number): Refusal => ({
  input: 'partialFactors.target',
  limit: TARGET_PROBABILITIES.join(', '),
  value: Number.isFinite(target) ? target : String(target),
  message: `The target probability is ${target}; the table has ${TARGET_PROBABILITIES.join(', ')}.`,
  instead: 'Choose the next smaller target of the table.',
});

/** The inputs a factor acts on. */
export interface FactoredInputs {
  /** Every primary stress [MPa]. */
  readonly primaryMPa: readonly number[];
  /** Depth or height, and length [mm]. */
  readonly heightMm: number;
  readonly lengthMm: number;
  /** Kmat [MPa·√mm]. */
  readonly toughness: number;
  readonly yieldMPa: number;
  readonly tensileMPa: number;
}

/** The inputs as entered, and as the assessment takes them. */
export interface WithFactors {
  readonly entered: FactoredInputs;
  readonly applied: FactoredInputs;
}

/** Stress and size times their factors, toughness and both strengths divided by theirs. */
export function applyPartialFactors(entered: FactoredInputs, factors: PartialFactors): WithFactors {
  return {
    entered,
    applied: {
      primaryMPa: entered.primaryMPa.map((stress) => stress * factors.stress),
      heightMm: entered.heightMm * factors.size,
      lengthMm: entered.lengthMm * factors.size,
      toughness: entered.toughness / factors.toughness,
      yieldMPa: entered.yieldMPa / factors.yield,
      tensileMPa: entered.tensileMPa / factors.yield,
    },
  };
}
