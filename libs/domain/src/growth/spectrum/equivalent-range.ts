/** So many cycles of one range. */
export interface RangeCount {
  readonly rangeMPa: number;
  readonly count: number;
}

/**
 * Sum of n ΔS^m: what a spectrum does to a flaw under a law with one exponent.
 * @param blocks ranges and their counts [MPa]
 * @param exponent exponent of the law, m [-]
 * @returns Σ n ΔS^m [MPa^m]
 * @validity no threshold, one exponent
 * @source Miner's rule with the Paris law
 * @example rangeSum([{ rangeMPa: 2, count: 3 }, { rangeMPa: 1, count: 5 }], 3) // 29
 */
export const rangeSum = (blocks: readonly RangeCount[], exponent: number): number =>
  blocks.reduce((sum, { rangeMPa, count }) => sum + count * rangeMPa ** exponent, 0);

/**
 * The constant range that does as much in as many cycles, (Σ n ΔS^m/Σ n)^(1/m); 0 for no cycles.
 * @param blocks ranges and their counts [MPa]
 * @param exponent exponent of the law, m [-]
 * @returns equivalent range ΔSeq [MPa]
 * @validity no threshold, one exponent and constant shape factor; otherwise step through the blocks
 * @source Miner's rule with the Paris law
 * @example equivalentRange([{ rangeMPa: 2, count: 1 }, { rangeMPa: 2, count: 5 }], 3) // 2
 */
export function equivalentRange(blocks: readonly RangeCount[], exponent: number): number {
  const cycles = blocks.reduce((sum, { count }) => sum + count, 0);
  return cycles > 0 ? (rangeSum(blocks, exponent) / cycles) ** (1 / exponent) : 0;
}

/**
 * Miner's sum, Σ n/N: 1 is the end of a life that is counted by cycles to failure.
 * @param blocks ranges and their counts [MPa]
 * @param cyclesToFailure cycles to failure at a range; Infinity for a harmless one [cycles]
 * @returns sum of the shares of life used [-]
 * @validity cycles to failure above 0
 * @source Palmgren 1924, Miner 1945
 * @example minerSum([{ rangeMPa: 100, count: 50 }, { rangeMPa: 50, count: 100 }], (range) => 1e6 / range) // 0.01
 */
export const minerSum = (
  blocks: readonly RangeCount[],
  cyclesToFailure: (range: number) => number,
): number =>
  blocks.reduce((sum, { rangeMPa, count }) => sum + count / cyclesToFailure(rangeMPa), 0);
