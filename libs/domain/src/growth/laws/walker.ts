/**
 * Range of stress intensity at R = 0 that does as much as a range at another stress ratio, by Walker:
 * ΔK/(1 − R)^(1 − γ); with γ = 0 below R = 0, which leaves Kmax.
 * @param range range of stress intensity, ΔK [MPa·√mm]
 * @param stressRatio minimum over maximum, R [-]
 * @param gamma exponent of Walker for R ≥ 0, γ [-]
 * @returns equivalent range [MPa·√mm]
 * @validity R < 1; 0 ≤ γ ≤ 1
 * @source Walker, ASTM STP 462 (1970) (from memory); γ = 0 for R < 0 after Dowling, Mechanical Behavior of Materials (from memory)
 * @example walkerRange(20, 0.5, 0.5) // 28.284271247
 */
export const walkerRange = (range: number, stressRatio: number, gamma: number): number =>
  range / (1 - stressRatio) ** (1 - (stressRatio < 0 ? 0 : gamma));
