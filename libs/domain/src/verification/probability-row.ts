import type { CheckRow } from './check-row';

/** A row of the probability group. */
export const probabilityRow = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  [kind, source]: readonly [CheckRow['kind'], string],
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Probability',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

export const CLOSED = ['closed form', 'closed form'] as const;
