import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { inputName } from '../../shared/assessed/input-names';
import { valueText } from '../../shared/difference/difference-rows';
import { given } from './edit-input';

export interface InputDifference {
  readonly name: string;
  readonly unit: string;
  readonly before: string;
  readonly after: string;
}

/** What differs between the inputs of two assessments: values first, then origins and notes. */
export function inputDifferences(
  before: AssessmentInput,
  after: AssessmentInput,
): readonly InputDifference[] {
  const [from, to] = [leaves(before), leaves(after)];
  return [...new Set([...from.keys(), ...to.keys()])].flatMap((path) => {
    const [old, now] = [from.get(path) ?? 'not given', to.get(path) ?? 'not given'];
    return old === now ? [] : [{ ...inputName(path), before: old, after: now }];
  });
}

/** Leaves of the inputs by path, as a reader wants them; a value stands with its origin and note. */
function leaves(data: unknown, path = '', found = new Map<string, string>()): Map<string, string> {
  const value = given(data);
  if (value) {
    const note = value.note ? ` (${value.provenance}: ${value.note})` : ` (${value.provenance})`;
    return found.set(path, `${valueText(value.value)}${note}`);
  }
  if (data !== null && typeof data === 'object') {
    for (const [name, inner] of Object.entries(data)) {
      leaves(inner, path ? `${path}.${name}` : name, found);
    }
    return found;
  }
  return data === null ? found : found.set(path, valueText(data));
}
