import { dayText, momentText } from '../format/day-text';
import { numberText } from '../quantity/quantity-text';
import { fieldLabel } from './field-label';

type Snapshot = Readonly<Record<string, unknown>> | null;

/** One value of a change, as words. */
export interface DifferenceRow {
  readonly label: string;
  readonly unit: string;
  /** Null where there was no state before. */
  readonly before: string | null;
  /** Null where there is no state after. */
  readonly after: string | null;
}

const DEEPEST = 5;

/** What differs between two states of a record, value by value, nested ones under their path. */
export function differenceRows(
  before: Snapshot,
  after: Snapshot,
  timeZone = 'UTC',
): DifferenceRow[] {
  const [from, to] = [flat(before), flat(after)];
  const paths = [...new Set([...from.keys(), ...to.keys()])];
  return paths.flatMap((key): DifferenceRow[] => {
    const [old, now] = [from.get(key), to.get(key)];
    const row = {
      ...fieldLabel(JSON.parse(key) as string[]),
      before: before ? valueText(old, timeZone) : null,
      after: after ? valueText(now, timeZone) : null,
    };
    return row.before === row.after ? [] : [row];
  });
}

/** Leaves of a record by their path; lists of plain values are leaves too. */
function flat(value: unknown, path: readonly string[] = [], found = new Map<string, unknown>()) {
  if (isRecord(value) && path.length < DEEPEST) {
    for (const [name, member] of Object.entries(value)) flat(member, [...path, name], found);
  } else if (path.length > 0) {
    found.set(JSON.stringify(path), value);
  }
  return found;
}

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const DAY = /^\d{4}-\d{2}-\d{2}$/;
const INSTANT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d+)?Z$/;
const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** A value as a reader wants it: dates in words, numbers to what they say, nothing as a dash. */
export function valueText(value: unknown, timeZone = 'UTC'): string {
  if (value === null || value === undefined || value === '') return '—';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return figure(value);
  if (Array.isArray(value)) return value.map((each) => valueText(each, timeZone)).join(', ') || '—';
  if (typeof value === 'object') return JSON.stringify(value);
  const text = String(value);
  if (DAY.test(text)) return dayText(text);
  if (INSTANT.test(text)) return momentText(text, timeZone);
  return UUID.test(text) ? `record ${text.slice(0, 8)}` : text;
}

/** Every digit that was recorded, up to nine; very small and large ones by powers of ten. */
function figure(value: number): string {
  const size = Math.abs(value);
  if (size !== 0 && (size < 1e-4 || size >= 1e9)) return value.toExponential().replace('-', '−');
  return numberText(Number(value.toPrecision(9)), 9);
}
