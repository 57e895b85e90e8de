/** A number found in nested data, with the full path to it. */
export interface FoundNumber {
  readonly path: string;
  readonly value: number;
}

/**
 * Reads the numbers at a path; `*` stands for every place of a list, an input with its origin counts as its
 * value. Null on the way means "not given" and finds nothing; anything else that is no number finds NaN.
 */
export function readNumbers(data: unknown, path: string): readonly FoundNumber[] {
  return walk(data, path.split('.'), []);
}

/** As `readNumbers`, for what may be left out: a member that is not there finds nothing. */
export const readGivenNumbers = (data: unknown, path: string): readonly FoundNumber[] =>
  readNumbers(data, path).filter(
    ({ path: at, value }) => !Number.isNaN(value) || isThere(data, at),
  );

function isThere(data: unknown, path: string): boolean {
  const inner = path.split('.').reduce<unknown>((each, name) => {
    if (Array.isArray(each)) return each[Number(name)] as unknown;
    return isRecord(each) ? each[name] : undefined;
  }, data);
  return inner !== undefined;
}

function walk(data: unknown, rest: readonly string[], gone: readonly string[]): FoundNumber[] {
  if (data === null) return [];
  const [next, ...after] = rest;
  if (next === undefined) return [{ path: gone.join('.'), value: numberOf(data) }];
  if (next === '*') {
    if (!Array.isArray(data)) return [{ path: gone.join('.'), value: Number.NaN }];
    return data.flatMap((item: unknown, i) => walk(item, after, [...gone, String(i)]));
  }
  const inner: unknown = isRecord(data) ? data[next] : undefined;
  return inner === undefined
    ? [{ path: [...gone, ...rest].join('.'), value: Number.NaN }]
    : walk(inner, after, [...gone, next]);
}

const isRecord = (data: unknown): data is Readonly<Record<string, unknown>> =>
  typeof data === 'object' && data !== null;

function numberOf(data: unknown): number {
  const value = isRecord(data) ? data['value'] : data;
  return typeof value === 'number' ? value : Number.NaN;
}
