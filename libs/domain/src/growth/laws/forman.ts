/**
 * Room left before the crack runs in one cycle, by Forman: (1 − R) Kc − ΔK. Not above 0: unstable.
 * @param range range of stress intensity, ΔK [MPa·√mm]
 * @param stressRatio minimum over maximum, R [-]
 * @param toughness toughness of the section, Kc [MPa·√mm]
 * @returns margin on ΔK [MPa·√mm]
 * @validity R < 1
 * @source Kmax = ΔK/(1 − R) against Kc
 * @example stabilityMargin(20, 0.5, 100) // 30
 */
export const stabilityMargin = (range: number, stressRatio: number, toughness: number): number =>
  (1 - stressRatio) * toughness - range;

// a run that carries instability as its end steps over it by a little; the rate must stay a number there
const LEAST_MARGIN = 1e-9;

/**
 * Growth per cycle by Forman: C ΔK^m/((1 − R) Kc − ΔK). At and beyond instability the divisor stays at a
 * billionth of Kc: the end is `stabilityMargin`, not the rate.
 * @param law coefficient with ΔK and Kc in MPa·√mm, exponent, and Kc [-]
 * @param range range of stress intensity, ΔK [MPa·√mm]
 * @param stressRatio minimum over maximum, R [-]
 * @returns da/dN [mm/cycle]
 * @validity 0 ≤ R < 1; ΔK < (1 − R) Kc
 * @source Forman, Kearney and Engle 1967 (from memory)
 * @example formanRate({ coefficient: 1e-6, exponent: 3, toughnessMPaSqrtMm: 100 }, 20, 0.5) // 0.00026666667
 */
export function formanRate(
  {
    coefficient,
    exponent,
    toughnessMPaSqrtMm,
  }: {
    readonly coefficient: number;
    readonly exponent: number;
    readonly toughnessMPaSqrtMm: number;
  },
  range: number,
  stressRatio: number,
): number {
  const margin = stabilityMargin(range, stressRatio, toughnessMPaSqrtMm);
  return (coefficient * range ** exponent) / Math.max(margin, LEAST_MARGIN * toughnessMPaSqrtMm);
}
