/**
 * JSON with the keys of every object in order, so that equal content has equal text (and so an equal hash) everywhere.
 * Undefined members are left out; dates become ISO 8601.
 */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(ordered(value)) ?? 'null';
}

function ordered(value: unknown): unknown {
  if (value instanceof Date) return value.toISOString();
  if (Array.isArray(value)) return value.map(ordered);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
      .map(([name, member]) => [name, ordered(member)]),
  );
}
