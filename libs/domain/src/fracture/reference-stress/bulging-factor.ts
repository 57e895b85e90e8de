/**
 * Bulging factor of an axial through-wall crack, rational fit:
 * Mt = √[(1.02 + 0.4411 λ² + 0.006124 λ⁴)/(1 + 0.02642 λ² + 1.533·10⁻⁶ λ⁴)].
 * @param lambda shell parameter, 1.818 c/√(Ri t) [-]
 * @returns bulging factor Mt [-]
 * @validity λ ≥ 0; tends to 1.00995 at 0, not to 1: the fit itself is 1 % high there
 * @source API 579-1 equation 9C.8 (seen in a secondary source that cites it)
 * @example bulgingFactor(1.285520128197143) // 1.300691118
 */
export function bulgingFactor(lambda: number): number {
  const l2 = lambda * lambda;
  const above = 1.02 + (0.4411 + 0.006124 * l2) * l2;
  const below = 1 + (0.02642 + 1.533e-6 * l2) * l2;
  return Math.sqrt(above / below);
}

/**
 * Folias-type bulging factor in the simple shell form, MT = √(1 + 1.6 c²/(r B)).
 * @param c half length, c [mm]
 * @param radius mean radius, r [mm]
 * @param thickness wall, B [mm]
 * @returns bulging factor MT, exactly 1 without a crack [-]
 * @validity thin shell
 * @source BS 7910 Annex P, 2005 form (from memory)
 * @example foliasFactor(40, 762.5, 25) // 1.065032902
 */
export const foliasFactor = (c: number, radius: number, thickness: number): number =>
  Math.sqrt(1 + (1.6 * c * c) / (radius * thickness));
