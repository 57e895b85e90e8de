import type { GrowthState } from '@ligament/domain/assessment/assessment-outcome';

/** The growing flaw after so many years, between the states that were computed; null before the first and after the last. */
export function stateAt(path: readonly GrowthState[], years: number): GrowthState | null {
  const after = path.findIndex((state) => state.years >= years);
  const next = path[after];
  if (!next || years < 0) return null;
  const before = path[after - 1];
  if (!before || next.years === years || before.kind !== next.kind) return before ?? next;
  const share = (years - before.years) / (next.years - before.years);
  const mix = (from: number, to: number) => from + share * (to - from);
  return {
    years,
    kind: before.kind,
    cycles: mix(before.cycles, next.cycles),
    heightMm: mix(before.heightMm, next.heightMm),
    lengthMm: mix(before.lengthMm, next.lengthMm),
    ligamentMm: mix(before.ligamentMm, next.ligamentMm),
    kMaxMPaSqrtM: mix(before.kMaxMPaSqrtM, next.kMaxMPaSqrtM),
    kr: mix(before.kr, next.kr),
    lr: mix(before.lr, next.lr),
  };
}
