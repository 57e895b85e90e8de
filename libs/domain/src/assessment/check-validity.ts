import type { Crack } from '../geometry/crack';
import { checkLimit, type Limit } from '../geometry/limit';
import type { Refusal, ValidityCheck } from './assessment-outcome';
import { number } from './number-text';

/** Every limit of the chosen solutions, as this crack meets it or not. */
export const validityChecks = (limits: readonly Limit[], crack: Crack): readonly ValidityCheck[] =>
  limits.map((limit) => checkLimit(limit, crack));

/** The limits that are broken, as refusals that name the input and what to do instead. */
export function validityRefusals(limits: readonly Limit[], crack: Crack): readonly Refusal[] {
  return limits.flatMap((limit) => {
    const { met, value } = checkLimit(limit, crack);
    if (met) return [];
    return {
      input: limit.input,
      limit: limit.text,
      value: Number.isFinite(value) ? value : String(value),
      message: `${limit.name} is ${number(value)}; the solution (${limit.source}) holds for ${limit.text}.`,
      instead: limit.instead,
    };
  });
}
