import type { Crack } from '../../geometry/crack';
import { checkLimit, type Limit } from '../../geometry/limit';
import type { Refusal } from '../../geometry/refusal';

/** A refusal for every limit of a solution that a crack breaks. */
export const brokenLimits = (limits: readonly Limit[], crack: Crack): readonly Refusal[] =>
  limits.flatMap((limit) => {
    const { value, met } = checkLimit(limit, crack);
    return met ? [] : [refusalOf(limit, value)];
  });

const refusalOf = ({ name, text, input, instead }: Limit, value: number): Refusal => ({
  input,
  limit: text,
  value: Number.isFinite(value) ? value : String(value),
  message: `${name} is ${Number.isFinite(value) ? Number(value.toPrecision(4)) : value}; the solution holds for ${text}.`,
  instead,
});
