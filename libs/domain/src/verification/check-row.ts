/** What stands behind a published value. */
export type CheckKind =
  'published table' | 'exact limit' | 'closed form' | 'independent computation' | 'from memory';

/** One value the engine is held against. */
export interface CheckRow {
  readonly id: string;
  readonly group: string;
  readonly quantity: string;
  readonly published: number;
  readonly unit: string;
  /** Largest relative deviation that counts as agreement; absolute when the published value is 0. */
  readonly tolerance: number;
  readonly kind: CheckKind;
  readonly source: string;
  readonly compute: () => number;
}

/** A row with what the engine gives for it now. */
export interface CheckResult extends Omit<CheckRow, 'compute'> {
  readonly computed: number;
  /** Relative deviation; absolute when the published value is 0. */
  readonly deviation: number;
  readonly met: boolean;
}

/** Computes one row. */
export function evaluateRow({ compute, ...row }: CheckRow): CheckResult {
  const computed = compute();
  const difference = computed - row.published;
  const deviation = row.published === 0 ? difference : difference / row.published;
  return { ...row, computed, deviation, met: Math.abs(deviation) <= row.tolerance };
}
