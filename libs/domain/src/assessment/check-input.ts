import type { AssessmentInput } from './assessment-input';
import type { Refusal } from './assessment-outcome';
import { checkRelations } from './check-relations';
import { inputBounds, type BoundedValue } from './input-bounds';
import { number } from './number-text';

/** Every input that is impossible or cannot be meant, with its limit; empty when the input can be assessed. */
export function checkInput(input: AssessmentInput): readonly Refusal[] {
  const single = inputBounds(input).filter(outOfBounds).map(refuse);
  // values that are no numbers, or in another unit, cannot be compared with each other
  return single.length > 0 ? single : checkRelations(input);
}

// written so that NaN is out of bounds too
const outOfBounds = ({ value, min, max, above }: BoundedValue): boolean =>
  !(value <= max && (above ? value > min : value >= min));

function refuse({ path, name, unit, value, min, max, above, hint }: BoundedValue): Refusal {
  const finite = Number.isFinite(value);
  const low = above ? `above ${number(min)}` : `at least ${number(min)}`;
  const limit = `${low} and at most ${number(max)} ${unit}`.trim();
  const got = finite ? `is ${number(value)} ${unit}`.trim() : 'is not a number';
  return {
    input: path,
    limit,
    value: finite ? value : String(value),
    message: `${name} ${got}; it must be ${limit}.`,
    instead: hint,
  };
}
