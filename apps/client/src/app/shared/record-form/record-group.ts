import { FormControl, FormGroup } from '@angular/forms';
import { prose, provenance, reason } from '@ligament/domain/contract/primitives';
import type { z } from 'zod';
import { fits } from '../validation/fits';
import type { FieldValue, RecordField } from './record-field';

export type Checks = Readonly<Record<string, z.ZodType>>;
export type RecordValue = Readonly<Record<string, unknown>>;
export type RecordGroup = FormGroup<Record<string, FormControl<FieldValue>>>;

const NOTE = prose(500);

/** The form of a record: one control a field, two more where a field asks for its origin, one for the reason of a change. */
export function recordGroup(
  fields: readonly RecordField[],
  checks: Checks,
  start: RecordValue,
  asksReason: boolean,
): RecordGroup {
  const controls: Record<string, FormControl<FieldValue>> = {};
  const origins = (start['origins'] ?? {}) as Readonly<
    Record<string, { readonly provenance: string; readonly note: string }>
  >;
  for (const field of fields) {
    controls[field.name] = control(start[field.name] ?? emptyOf(field), checks[field.name]);
    if (!field.origin) continue;
    controls[`${field.name}-provenance`] = control(
      origins[field.name]?.provenance ?? 'assumed',
      provenance,
    );
    controls[`${field.name}-note`] = control(origins[field.name]?.note ?? '', NOTE);
  }
  if (asksReason) controls['reason'] = control('', reason);
  return new FormGroup(controls);
}

/** What the form holds, as the contract's body wants it: origins gathered, empty dates left out as null. */
export function recordValue(fields: readonly RecordField[], group: RecordGroup): RecordValue {
  const value: Record<string, unknown> = {};
  const origins: Record<string, unknown> = {};
  const held = (name: string) => group.controls[name]?.value ?? null;
  for (const { name, kind, origin } of fields) {
    value[name] = kind === 'date' ? held(name) || null : held(name);
    if (origin) {
      origins[name] = { provenance: held(`${name}-provenance`), note: held(`${name}-note`) };
    }
  }
  if (Object.keys(origins).length > 0) value['origins'] = origins;
  if (group.controls['reason']) value['reason'] = held('reason');
  return value;
}

function control(value: unknown, check: z.ZodType | undefined): FormControl<FieldValue> {
  return new FormControl<FieldValue>(value as FieldValue, {
    validators: check ? [fits(check)] : [],
  });
}

function emptyOf({ kind, choices }: RecordField): FieldValue {
  if (kind === 'flag') return false;
  if (kind === 'choice') return choices?.[0]?.value ?? null;
  return kind === 'number' || kind === 'date' ? null : '';
}
