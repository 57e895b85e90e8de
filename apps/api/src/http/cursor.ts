import { Failure } from './failure';

export type CursorValue = string | number;

/** Where a page ends, as opaque text: the last row's sort values. */
export const encodeCursor = (values: readonly CursorValue[]): string =>
  Buffer.from(JSON.stringify(values)).toString('base64url');

/** Sort values of a cursor; whoever makes one up is refused. */
export function decodeCursor(
  cursor: string,
  types: readonly ('string' | 'number')[],
): CursorValue[] {
  const values = parsed(Buffer.from(cursor, 'base64url').toString('utf8'));
  const fits =
    Array.isArray(values) &&
    values.length === types.length &&
    types.every((type, index) => typeof values[index] === type);
  if (!fits) {
    throw new Failure(
      'cursor',
      400,
      'Address not understood',
      'The place to go on from is not one of this list. Start from its first page.',
    );
  }
  return values as CursorValue[];
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    if (error instanceof SyntaxError) return undefined;
    throw error;
  }
}

/** Rows of a page, of which one more than the limit was read, and the cursor after the last. */
export function cutPage<R>(
  rows: readonly R[],
  limit: number,
  place: (row: R) => readonly CursorValue[],
) {
  const kept = rows.slice(0, limit);
  const last = kept.at(-1);
  return { rows: kept, nextCursor: rows.length > limit && last ? encodeCursor(place(last)) : null };
}

/** Words of a search as a pattern for `ilike`, their own wildcards taken literally. */
export const containing = (words: string): string => `%${words.replaceAll(/[\\%_]/g, '\\$&')}%`;
