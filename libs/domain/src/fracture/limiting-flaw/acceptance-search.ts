import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import { firstCrossing } from '../../numerics/first-crossing';

/** What is searched for: a load, a pressure, a toughness or a temperature, in its unit. */
export interface AcceptanceQuestion {
  /** Path of the input, for a refusal. */
  readonly input: string;
  readonly name: string;
  readonly unit: string;
  readonly least: number;
  readonly most: number;
  /** Room to the line at a value, above 0 where the flaw is acceptable. */
  readonly margin: (value: number) => number;
}

/** The boundary found, or why there is none in the range. */
export type AcceptanceBoundary =
  | { readonly status: 'found'; readonly value: number; readonly because: string }
  /** Acceptable over the whole range: the bound of the range is given, not a boundary. */
  | { readonly status: 'acceptable throughout'; readonly value: number; readonly because: string }
  | { readonly status: 'never acceptable'; readonly because: string }
  | Refused;

/**
 * Largest value up to which the flaw is acceptable, counted from the least: a load factor or a pressure. What
 * lies beyond a first crossing is never reached through it, so a later acceptable range does not count.
 */
export function largestAcceptable(question: AcceptanceQuestion): AcceptanceBoundary {
  const { name, unit, least, most, margin } = question;
  return boundary(question, margin, least, most, {
    throughout: `Acceptable up to the largest ${name} looked at, ${most} ${unit}`.trim(),
    never: `Not acceptable even at the smallest ${name} looked at, ${least} ${unit}`.trim(),
  });
}

/**
 * Least value above which the flaw is acceptable throughout: a toughness or a temperature. It is searched from
 * the top, so that everything above it is acceptable.
 */
export function leastAcceptable(question: AcceptanceQuestion): AcceptanceBoundary {
  const { name, unit, least, most, margin } = question;
  const mirrored = boundary(question, (x) => margin(most - (x - least)), least, most, {
    throughout: `Acceptable down to the smallest ${name} looked at, ${least} ${unit}`.trim(),
    never: `Not acceptable even at the largest ${name} looked at, ${most} ${unit}`.trim(),
  });
  return 'value' in mirrored ? { ...mirrored, value: most - (mirrored.value - least) } : mirrored;
}

interface Words {
  readonly throughout: string;
  readonly never: string;
}

function boundary(
  question: AcceptanceQuestion,
  margin: (value: number) => number,
  least: number,
  most: number,
  { throughout, never }: Words,
): AcceptanceBoundary {
  const refusals = refusalsOf(question);
  if (refusals.length > 0) return refused(...refusals);
  const crossing = firstCrossing(margin, least, most, {
    intervals: 48,
    tolerance: 1e-12 * (most - least),
  });
  switch (crossing.status) {
    case 'found':
      return {
        status: 'found',
        value: crossing.x,
        because: 'The flaw reaches the line of the diagram there.',
      };
    case 'none':
      return { status: 'acceptable throughout', value: most, because: `${throughout}.` };
    case 'below from the start':
      return { status: 'never acceptable', because: `${never}.` };
    case 'not a number':
      return refused(noNumber(question));
  }
}

const refusalsOf = ({ input, name, unit, least, most }: AcceptanceQuestion): readonly Refusal[] =>
  outOfBounds([
    { ...RANGE, input, name: `Least ${name}`, unit, value: least },
    {
      ...RANGE,
      input,
      name: `Largest ${name}`,
      unit,
      value: most,
      min: Number.isFinite(least) ? least : RANGE.min,
      above: true,
    },
  ]);

const RANGE = {
  min: -1e9,
  max: 1e9,
  instead: 'Give the range from the least to the largest value.',
} as const;

const noNumber = ({ input, name, least, most }: AcceptanceQuestion): Refusal => ({
  input,
  limit: 'a margin that is a number over the whole range',
  value: null,
  message: `The margin is no number for some ${name} between ${least} and ${most}.`,
  instead: 'Narrow the range to what the solutions hold for.',
});
