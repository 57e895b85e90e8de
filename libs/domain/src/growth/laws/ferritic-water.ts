import type { PowerOfRange } from '../../materials/crack-law';

const LOW_R = 0.25;
const HIGH_R = 0.65;

/** By stress ratio: constant, a line, constant. */
function scale(
  stressRatio: number,
  { slope, at, high }: { readonly slope: number; readonly at: number; readonly high: number },
): number {
  if (stressRatio <= LOW_R) return 1;
  return stressRatio >= HIGH_R ? high : slope * stressRatio + at;
}

/**
 * Factor on the lower piece of growth in water: 1 | 26.9 R − 5.725 | 11.76, breaks at R = 0.25 and 0.65.
 * @param stressRatio minimum over maximum, R [-]
 * @returns factor S [-]
 * @validity R < 1
 * @source ASME XI A-4300(b)(2) (from memory)
 * @example lowWaterScale(0.5) // 7.725
 */
export const lowWaterScale = (stressRatio: number): number =>
  scale(stressRatio, { slope: 26.9, at: -5.725, high: 11.76 });

/**
 * Factor on the upper piece of growth in water: 1 | 3.75 R + 0.06 | 2.5, breaks at R = 0.25 and 0.65.
 * @param stressRatio minimum over maximum, R [-]
 * @returns factor S [-]
 * @validity R < 1
 * @source ASME XI A-4300(b)(2) (from memory)
 * @example highWaterScale(0.5) // 1.935
 */
export const highWaterScale = (stressRatio: number): number =>
  scale(stressRatio, { slope: 3.75, at: 0.06, high: 2.5 });

/**
 * Range at which the two pieces of growth in water meet at a stress ratio.
 * @param pieces lower and upper piece at R ≤ 0.25, coefficients in one pair of units [-]
 * @param stressRatio minimum over maximum, R [-]
 * @returns transition ΔK in the unit of the coefficients [MPa·√mm]
 * @validity R < 1
 * @source ASME XI A-4300(b)(2) (from memory): the pieces are equal there
 * @example waterTransition({ low: { coefficient: 1.02e-12, exponent: 5.95 }, high: { coefficient: 1.01e-7, exponent: 1.95 } }, 0.1) // 17.739
 */
export const waterTransition = (
  { low, high }: { readonly low: PowerOfRange; readonly high: PowerOfRange },
  stressRatio: number,
): number =>
  ((high.coefficient * highWaterScale(stressRatio)) /
    (low.coefficient * lowWaterScale(stressRatio))) **
  (1 / (low.exponent - high.exponent));
