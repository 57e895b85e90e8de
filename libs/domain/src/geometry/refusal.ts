/** Why no value is given: which input breaks which limit, and what can be done instead. */
export interface Refusal {
  /** Path of the input at fault, e.g. `hole.radiusMm`. */
  readonly input: string;
  /** The limit in words and figures. */
  readonly limit: string;
  /** The value it got, already in the unit of the limit. */
  readonly value: number | string | null;
  readonly message: string;
  /** What to do instead. */
  readonly instead: string;
}

/** An answer that holds no values, only the reasons. */
export interface Refused {
  readonly status: 'refused';
  readonly refusals: readonly Refusal[];
}

/** What one number may be, and what a value far outside usually means. */
export interface NumberRule {
  readonly input: string;
  readonly name: string;
  readonly unit: string;
  readonly value: number;
  readonly min: number;
  readonly max: number;
  /** The lower bound itself is not allowed. */
  readonly above?: boolean;
  readonly instead: string;
}

/** Refuses for the given reasons. */
export const refused = (...refusals: readonly Refusal[]): Refused => ({
  status: 'refused',
  refusals,
});

/** The refusals of every number that is outside its bounds, not finite or no number at all. */
export const outOfBounds = (rules: readonly NumberRule[]): readonly Refusal[] =>
  rules.filter(broken).map(refusalOf);

// written so that NaN is out of bounds too
const broken = ({ value, min, max, above }: NumberRule): boolean =>
  !(Number.isFinite(value) && value <= max && (above ? value > min : value >= min));

function refusalOf({ input, name, unit, value, min, max, above, instead }: NumberRule): Refusal {
  const low = above ? `above ${figure(min)}` : `at least ${figure(min)}`;
  const limit = `${low} and at most ${figure(max)} ${unit}`.trim();
  const got = Number.isFinite(value)
    ? `is ${figure(value)} ${unit}`.trim()
    : `is ${value}, not a number`;
  return {
    input,
    limit,
    value: Number.isFinite(value) ? value : String(value),
    message: `${name} ${got}; it must be ${limit}.`,
    instead,
  };
}

// a bound worked out from another input carries roundings nobody wants to read
const figure = (value: number): number => Number(value.toPrecision(6));
