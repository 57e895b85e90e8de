import type { CheckKind, CheckRow } from './check-row';

/** A row under the heading of crack growth. */
export const growthRow = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Crack growth',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

/** A worked example as one line: printed in a source unless another kind is given. */
export type Example = readonly [
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  source: string,
  compute: () => number,
  kind?: CheckKind,
];

/** Numbered rows of worked examples. */
export const exampleRows = (prefix: string, examples: readonly Example[]): readonly CheckRow[] =>
  examples.map(
    ([quantity, published, unit, tolerance, source, compute, kind = 'published table'], i) =>
      growthRow(`${prefix}-${i + 1}`, quantity, published, unit, tolerance, kind, source, compute),
  );
