import type { FieldValue, RecordField } from './record-field';
import type { RecordGroup } from './record-group';

/** A field that somebody else changed while the form was open. */
export interface ChangedMeanwhile {
  readonly label: string;
  readonly before: string;
  readonly now: string;
  /** What was typed here instead; null when the other's value was taken over. */
  readonly yours: string | null;
}

/**
 * Brings what somebody else recorded meanwhile into an open form: fields left alone take the new value, fields that
 * were changed here keep theirs. Every changed field is told.
 * @param base the form as it was opened
 * @param theirs the form as it would be opened now
 */
export function mergeMeanwhile(
  fields: readonly RecordField[],
  group: RecordGroup,
  base: RecordGroup,
  theirs: RecordGroup,
): ChangedMeanwhile[] {
  return Object.entries(theirs.controls).flatMap(([name, control]) => {
    const mine = group.controls[name];
    const before = base.controls[name]?.value ?? null;
    const now = control.value;
    if (name === 'reason' || !mine || before === now) return [];
    const kept = mine.value !== before && mine.value !== now;
    const typed = mine.value;
    if (!kept) mine.setValue(now);
    const field = fields.find((each) => name === each.name || name.startsWith(`${each.name}-`));
    const words = (value: FieldValue) => wordsFor(name === field?.name ? field : undefined, value);
    return {
      label: labelOf(field, name),
      before: words(before),
      now: words(now),
      yours: kept ? words(typed) : null,
    };
  });
}

function labelOf(field: RecordField | undefined, name: string): string {
  if (!field) return name;
  if (name.endsWith('-provenance')) return `${field.label}: where it comes from`;
  return name.endsWith('-note') ? `${field.label}: document or reason` : field.label;
}

function wordsFor(field: RecordField | undefined, value: FieldValue): string {
  const chosen = field?.choices?.find((each) => each.value === value);
  if (chosen) return chosen.label;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return value === null || value === '' ? 'empty' : String(value);
}
