import { growthPerCycle, type GrowthLaw } from './growth-law';

/** One block of a year's histogram: stress ranges and how often they come. */
export interface StressBlock {
  readonly membraneRangeMPa: number;
  readonly bendingRangeMPa: number;
  readonly cyclesPerYear: number;
}

/** Rates at which depth (or half height) and half length grow [mm/year]. */
export interface Rates {
  a: number;
  c: number;
}

/** Range of K from a stress range, at the deepest point and at the end of the flaw [MPa·√mm]. */
export interface RangeOfK {
  readonly deepest: (membraneRange: number, bendingRange: number) => number;
  readonly end: (membraneRange: number, bendingRange: number) => number;
}

/** What drives the growth; either part may be absent. */
export interface Drivers {
  readonly fatigue: { readonly law: GrowthLaw; readonly blocks: readonly StressBlock[] } | null;
  readonly stressCorrosion: {
    readonly depthRateMmPerYear: number;
    readonly endRateMmPerYear: number;
  } | null;
}

/**
 * Growth per year with every driver added up: each block of cycles by its own ΔK against the threshold,
 * and the constant rates of stress corrosion on top (Wei and Landes superposition).
 */
export function ratesPerYear(
  { fatigue, stressCorrosion }: Drivers,
  range: RangeOfK,
): (into: Rates) => void {
  const perCycle = fatigue ? growthPerCycle(fatigue.law) : () => 0;
  const blocks = fatigue?.blocks ?? [];
  const depthRate = stressCorrosion?.depthRateMmPerYear ?? 0;
  const endRate = stressCorrosion?.endRateMmPerYear ?? 0;
  return (into) => {
    into.a = depthRate;
    into.c = endRate;
    for (const { membraneRangeMPa, bendingRangeMPa, cyclesPerYear } of blocks) {
      into.a += cyclesPerYear * perCycle(range.deepest(membraneRangeMPa, bendingRangeMPa));
      into.c += cyclesPerYear * perCycle(range.end(membraneRangeMPa, bendingRangeMPa));
    }
  };
}
