import type { CrackLaw } from '../materials/crack-law';
import { growthPerCycle, type GrowthLaw } from './growth-law';
import { ratePerCycle, type LawConditions, type RatePerCycle } from './laws/rate-per-cycle';

/** One block of a year's histogram: stress ranges and how often they come. */
export interface StressBlock {
  readonly membraneRangeMPa: number;
  readonly bendingRangeMPa: number;
  readonly cyclesPerYear: number;
  /** Minimum over maximum of the cycle, residual stress included; R ≥ 0.5 is taken when it is not given. */
  readonly stressRatio?: number;
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

/** A law by its stages alone, or one of any published form. */
export type FatigueLaw = GrowthLaw | CrackLaw;

/** What drives the growth; either part may be absent. */
export interface Drivers {
  readonly fatigue: {
    readonly law: FatigueLaw;
    readonly blocks: readonly StressBlock[];
    readonly conditions?: LawConditions;
  } | null;
  readonly stressCorrosion: {
    readonly depthRateMmPerYear: number;
    readonly endRateMmPerYear: number;
  } | null;
}

/** Stress ratio of a block that gives none: residual tension at a weld keeps the whole cycle open (common practice). */
export const RATIO_AT_WELDS = 0.5;

/** Growth per cycle of a law of either kind, from ΔK and R. */
export function lawPerCycle(law: FatigueLaw, conditions?: LawConditions): RatePerCycle {
  return 'form' in law ? ratePerCycle(law, conditions) : growthPerCycle(law);
}

/**
 * Growth per year with every driver added up: each block of cycles by its own ΔK and stress ratio against
 * the threshold, and the constant rates of stress corrosion on top (Wei and Landes superposition).
 */
export function ratesPerYear(
  { fatigue, stressCorrosion }: Drivers,
  range: RangeOfK,
): (into: Rates) => void {
  const perCycle = fatigue ? lawPerCycle(fatigue.law, fatigue.conditions) : () => 0;
  const blocks = fatigue?.blocks ?? [];
  const depthRate = stressCorrosion?.depthRateMmPerYear ?? 0;
  const endRate = stressCorrosion?.endRateMmPerYear ?? 0;
  return (into) => {
    into.a = depthRate;
    into.c = endRate;
    for (const block of blocks) {
      const { membraneRangeMPa, bendingRangeMPa, cyclesPerYear } = block;
      const ratio = block.stressRatio ?? RATIO_AT_WELDS;
      into.a += cyclesPerYear * perCycle(range.deepest(membraneRangeMPa, bendingRangeMPa), ratio);
      into.c += cyclesPerYear * perCycle(range.end(membraneRangeMPa, bendingRangeMPa), ratio);
    }
  };
}
