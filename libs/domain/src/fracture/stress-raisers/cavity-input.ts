import type { SnClass } from './sn-curve';

/** A number of equal load cycles a year, as nominal ranges in the full wall [MPa]. */
export interface CavityBlock {
  readonly membraneRangeMPa: number;
  readonly bendingRangeMPa: number;
  readonly cyclesPerYear: number;
}

/** A ground-out cavity as it is measured and loaded. */
export interface CavityInput {
  /** Wall beside the cavity. */
  readonly thicknessMm: number;
  /** Least wall the vessel needs there. */
  readonly requiredThicknessMm: number;
  readonly depthMm: number;
  readonly lengthMm: number;
  readonly widthMm: number;
  /** Smallest radius at the bottom; null when it was not measured. */
  readonly bottomRadiusMm: number | null;
  /** Nominal stress in the full wall, the larger of the two directions [MPa]. */
  readonly membraneMPa: number;
  /** Bending in the full wall, positive when the ground face is in tension [MPa]. */
  readonly bendingMPa: number;
  /** `held`: a dish in a shell that holds its sides; `free`: a groove along a strip that may turn. */
  readonly sides: 'held' | 'free';
  readonly yieldMPa: number;
  readonly tensileMPa: number;
  /** Extent over depth the grinding must leave, e.g. 4 for one in four. */
  readonly leastTaper: number;
  /** Null when the load does not vary. */
  readonly fatigue: {
    readonly surface: SnClass;
    readonly blocks: readonly CavityBlock[];
    readonly years: number;
  } | null;
}
