import type { Given } from '../units/provenance';

const WEAK = new Set(['assumed', 'standard default']);

/** Paths of every input whose origin is `assumed` or `standard default`, in alphabetical order: a record read back has its members in another order. */
export function listAssumed(value: unknown, path = ''): readonly string[] {
  if (value === null || typeof value !== 'object') return [];
  if (isGiven(value)) return WEAK.has(value.provenance) ? [path] : [];
  return Object.entries(value)
    .flatMap(([key, inner]) => listAssumed(inner, path ? `${path}.${key}` : key))
    .sort();
}

const isGiven = (value: object): value is Given<unknown> =>
  'provenance' in value && 'value' in value;
