import * as z from 'zod';
import { PROVENANCES } from '../units/provenance';

/** Identifier of a record. */
export const id = z.uuid({ error: 'This is not a valid record identifier.' });

/** Calendar date without time, ISO 8601. */
export const isoDate = z.iso.date({
  error: 'Give a date as year-month-day, for example 2026-11-10.',
});

/** Instant in UTC, ISO 8601. */
export const instant = z.iso.datetime({ offset: true });

/** Control characters never belong in a name, a subject or an address. */
// eslint-disable-next-line no-control-regex -- refusing control characters is the purpose
const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

/** One line of text, trimmed, without control characters. */
export const line = (max: number) =>
  z
    .string({ error: 'Fill this in.' })
    .trim()
    .min(1, { error: 'Fill this in.' })
    .max(max, { error: `At most ${max} characters.` })
    .refine((text) => !CONTROL.test(text) && !/[\r\n]/.test(text), {
      error: 'Line breaks and control characters are not allowed here.',
    });

/** One line of text that may be left empty. */
export const optionalLine = (max: number) =>
  z
    .string()
    .trim()
    .max(max, { error: `At most ${max} characters.` })
    .refine((text) => !CONTROL.test(text) && !/[\r\n]/.test(text), {
      error: 'Line breaks and control characters are not allowed here.',
    });

/** Several lines of text that may be empty. */
export const prose = (max: number) =>
  z
    .string()
    .trim()
    .max(max, { error: `At most ${max} characters.` })
    .refine((text) => !CONTROL.test(text), { error: 'Control characters are not allowed here.' });

/** A reason that a reader years later can understand. */
export const reason = prose(2000).min(3, { error: 'Give a reason in words.' });

/** A finite number between two bounds, both named in the message with their unit. */
export const between = (low: number, high: number, unit: string) =>
  z
    .number({ error: `Give a number in ${unit}.` })
    .min(low, { error: `Must be at least ${low} ${unit}.` })
    .max(high, { error: `Must be at most ${high} ${unit}.` });

/** A finite number above zero. */
export const above0 = (high: number, unit: string) =>
  z
    .number({ error: `Give a number in ${unit}.` })
    .gt(0, { error: `Must be above 0 ${unit}.` })
    .max(high, { error: `Must be at most ${high} ${unit}.` });

export const provenance = z.enum(PROVENANCES);

/** An input with its origin. */
export const given = <T extends z.ZodType>(value: T) =>
  z.strictObject({ value, provenance, note: prose(500) });

/** Page of a list: rows, and where the next page starts (null at the end). */
export const page = <T extends z.ZodType>(row: T) =>
  z.object({ rows: z.array(row), nextCursor: z.string().nullable() });

/** What every list takes: search words, a page size and where to start. Sort names are each list's own. */
export const listQuery = {
  search: z.string().trim().max(100).optional(),
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
};

/** Version the client has seen; every write of an existing record carries it in If-Match. */
export const version = z.number().int().min(1);

/** Problem details, RFC 9457, with the fields at fault. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  instance: z.string().optional(),
  errors: z.array(z.object({ field: z.string(), message: z.string() })).optional(),
  current: z.unknown().optional(),
});
export type ProblemDetails = z.infer<typeof problem>;
