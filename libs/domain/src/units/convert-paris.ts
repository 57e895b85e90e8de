import {
  MM_PER,
  MPA_SQRT_MM_PER,
  type LengthUnit,
  type StressIntensityUnit,
} from './exact-factors';

/** The units a Paris coefficient is quoted in: growth per cycle, and range of stress intensity. */
export interface ParisUnits {
  readonly growth: LengthUnit;
  readonly range: StressIntensityUnit;
}

/** The units of the engine: mm/cycle and MPa·√mm. */
export const ENGINE_PARIS_UNITS: ParisUnits = { growth: 'mm', range: 'MPa·√mm' };

/**
 * Coefficient A of da/dN = A ΔK^m from one pair of units to another; the exponent stays as it is.
 * A[m/cycle, MPa·√m] = A[mm/cycle, MPa·√mm] · (√1000)^m / 1000.
 */
export function convertParisCoefficient(
  coefficient: number,
  exponent: number,
  { from, to = ENGINE_PARIS_UNITS }: { readonly from: ParisUnits; readonly to?: ParisUnits },
): number {
  const length = MM_PER[from.growth] / MM_PER[to.growth];
  const range = MPA_SQRT_MM_PER[to.range] / MPA_SQRT_MM_PER[from.range];
  return coefficient * length * range ** exponent;
}
