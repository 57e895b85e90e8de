import type { GrowthLaw } from '../../../growth/growth-law';
import type { FatigueFlaw } from '../flaw-table';

/** A generator with a seed: the same flaws at every run. */
export function generator(seed: number): (low: number, high: number) => number {
  let state = seed;
  return (low, high) => {
    state = (state * 1_664_525 + 1_013_904_223) % 2 ** 32;
    return low + ((high - low) * state) / 2 ** 32;
  };
}

/** Two stages and a threshold, BS 7910 steel in air, R ≥ 0.5, mean + 2 SD (from memory). */
export const TWO_STAGES: GrowthLaw = {
  stages: [
    { coefficient: 2.1e-17, exponent: 5.1 },
    { coefficient: 1.29e-12, exponent: 2.88 },
  ],
  thresholdMPaSqrtMm: 63,
};

/** Random surface flaws that meet thresholds, changes of stage and a/c = 1 on their way. */
export function randomFlaws(count: number, seed = 20_261_201): FatigueFlaw[] {
  const between = generator(seed);
  return Array.from({ length: count }, () => {
    const thicknessMm = between(10, 60);
    const depthMm = thicknessMm * between(0.05, 0.3);
    const halfLengthMm = depthMm / between(0.2, 1);
    const wide = between(0, 1) < 0.5;
    return {
      thicknessMm,
      widthMm: wide ? Infinity : 10 * halfLengthMm + between(100, 1000),
      depthMm,
      halfLengthMm,
      membraneRangeMPa: between(60, 150),
      bendingRangeMPa: between(0, 80),
      limitRangeMPaSqrtMm: between(1500, 3000),
    };
  });
}
