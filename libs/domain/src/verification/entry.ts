import type { CheckKind, CheckRow } from './check-row';

/** A check value of a group, without its identity. */
export type Entry = readonly [
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
];

/** The rows of a group, numbered in their order. */
export const rowsOf = (
  group: string,
  prefix: string,
  entries: readonly Entry[],
): readonly CheckRow[] =>
  entries.map(([quantity, published, unit, tolerance, kind, source, compute], i) => ({
    id: `${prefix}-${i + 1}`,
    group,
    quantity,
    published,
    unit,
    tolerance,
    kind,
    source,
    compute,
  }));
