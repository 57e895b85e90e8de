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
