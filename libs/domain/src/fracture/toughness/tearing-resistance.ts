/** A tearing resistance curve JR = C Δa^m, as far as it was measured. */
export interface TearingCurve {
  /** C [N/mm per mm^m]. */
  readonly coefficient: number;
  readonly exponent: number;
  /** Largest extension the tests are valid to [mm]. */
  readonly validToMm: number;
}

/**
 * Resistance to tearing after an extension: JR = C Δa^m.
 * @param curve coefficient C [N/mm per mm^m] and exponent m [-]
 * @param extension ductile extension, Δa [mm]
 * @returns resistance, JR [N/mm]
 * @validity 0 ≤ Δa ≤ the extension the tests are valid to
 * @source power law of ASTM E1820 (from memory)
 * @example tearingResistance({ coefficient: 200, exponent: 0.4, validToMm: 2 }, 1) // 200
 */
export const tearingResistance = (
  { coefficient, exponent }: Pick<TearingCurve, 'coefficient' | 'exponent'>,
  extension: number,
): number => coefficient * extension ** exponent;

/**
 * Extension at instability where the driving J is proportional to the crack length: Δa = a0 m/(1 − m).
 * @param length crack length before tearing, a0 [mm]
 * @param exponent exponent of the resistance, m [-]
 * @returns extension at instability, Δa [mm]
 * @validity 0 < m < 1; load held, J = β a
 * @source closed form of the tangency of β (a0 + Δa) and C Δa^m
 * @example extensionAtInstability(10, 0.4) // 6.6666666667
 */
export const extensionAtInstability = (length: number, exponent: number): number =>
  (length * exponent) / (1 - exponent);

/**
 * Slope of the resistance, and of the driving J at instability: dJR/da = C m Δa^(m−1).
 * @param curve coefficient C [N/mm per mm^m] and exponent m [-]
 * @param extension extension at instability, Δa [mm]
 * @returns slope, β where J = β a [N/mm²]
 * @validity 0 < m < 1, Δa > 0
 * @source derivative of the power law
 * @example tearingSlope({ coefficient: 200, exponent: 0.4, validToMm: 10 }, 6.66666666667) // 25.629772
 */
export const tearingSlope = (
  { coefficient, exponent }: Pick<TearingCurve, 'coefficient' | 'exponent'>,
  extension: number,
): number => coefficient * exponent * extension ** (exponent - 1);
