// |1 − m/2| below which the power has become the logarithm
const LOGARITHM = 1e-12;

/**
 * What a power law takes from one size to another, ∫ a^(−m/2) da; at m = 2 the logarithm of the ratio.
 * @param exponent exponent of the law, m [-]
 * @param from first size, a0 [mm]
 * @param to second size, a1 [mm]
 * @returns integral; negative when the second size is the smaller [mm^(1 − m/2)]
 * @validity sizes above 0
 * @source integral of da/dN = A (Y ΔS √(πa))^m at constant Y; written with expm1 so that nothing is lost near m = 2
 * @example lifeIntegral(4, 2, 20) // 0.45
 */
export function lifeIntegral(exponent: number, from: number, to: number): number {
  const p = 1 - exponent / 2;
  const ratio = Math.log(to / from);
  if (Math.abs(p) < LOGARITHM) return ratio;
  return (from ** p * Math.expm1(p * ratio)) / p;
}

/**
 * Size at which the integral from a first size reaches a value: the inverse of `lifeIntegral`. Above m = 2
 * the integral to an infinite size is finite: from there on there is no size, and Infinity says so.
 * @param exponent exponent of the law, m [-]
 * @param from first size, a0 [mm]
 * @param integral value to be reached [mm^(1 − m/2)]
 * @returns size; Infinity when none is large enough [mm]
 * @validity size above 0
 * @source inverse of the integral of the power law
 * @example sizeOfIntegral(4, 2, 0.45) // 20
 */
export function sizeOfIntegral(exponent: number, from: number, integral: number): number {
  const p = 1 - exponent / 2;
  if (Math.abs(p) < LOGARITHM) return from * Math.exp(integral);
  const share = (p * integral) / from ** p;
  return share > -1 ? from * Math.exp(Math.log1p(share) / p) : Infinity;
}

/**
 * What one cycle adds to the integral: A (Y ΔS √π)^m.
 * @param stage coefficient in mm/cycle with MPa·√mm, and exponent [-]
 * @param drive Y ΔS [MPa]
 * @returns growth of the integral per cycle [mm^(1 − m/2)/cycle]
 * @validity drive ≥ 0
 * @source da/dN = A (Y ΔS √(πa))^m
 * @example integralPerCycle({ coefficient: 1e-15, exponent: 4 }, 80) // 4.0425900e-07
 */
export const integralPerCycle = (
  { coefficient, exponent }: { readonly coefficient: number; readonly exponent: number },
  drive: number,
): number => coefficient * (drive * Math.sqrt(Math.PI)) ** exponent;
