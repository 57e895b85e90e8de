import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { Given } from '@ligament/domain/units/provenance';
import { given, valueAt } from './edit-input';

/** Whether a value was put over the register's without saying why. */
export function isUnexplained(value: Given, register: Given | null): boolean {
  if (register === null || register.value === value.value) return false;
  const note = value.note.trim();
  return note === '' || note === register.note.trim();
}

/** Paths of every input with an origin. */
export function givenPaths(data: unknown, path = ''): readonly string[] {
  if (given(data)) return [path];
  if (data === null || typeof data !== 'object') return [];
  return Object.entries(data).flatMap(([name, inner]) =>
    givenPaths(inner, path ? `${path}.${name}` : name),
  );
}

/** Inputs that were put over the register's without a reason. */
export const unexplainedPaths = (
  input: AssessmentInput,
  register: AssessmentInput | null,
): readonly string[] =>
  register === null
    ? []
    : givenPaths(input).filter((path) => {
        const value = given(valueAt(input, path));
        return value !== null && isUnexplained(value, given(valueAt(register, path)));
      });
