/**
 * Part of the range in which the crack is open, by Elber: U = constant + slope R.
 * @param constant U at R = 0 [-]
 * @param slope rise with R [-]
 * @param stressRatio minimum over maximum, R [-]
 * @returns ΔKeff/ΔK, at least 0 and at most 1 [-]
 * @validity 2024-T3: 0.5 and 0.4 for −0.1 ≤ R ≤ 0.7
 * @source Elber, ASTM STP 486 (1971) (from memory)
 * @example openShare(0.5, 0.4, 0.3) // 0.62
 */
export const openShare = (constant: number, slope: number, stressRatio: number): number =>
  Math.min(1, Math.max(0, constant + slope * stressRatio));

/**
 * Opening function of Newman, f = Kop/Kmax: max(R, A0 + A1 R + A2 R² + A3 R³) from R = 0 up, A0 + A1 R below.
 * @param stressRatio minimum over maximum, R [-]
 * @param constraint α, 1 in plane stress to 3 in plane strain [-]
 * @param stressOverFlow largest stress over flow stress [-]
 * @returns opening level f [-]
 * @validity −2 ≤ R ≤ 1; 1 ≤ α ≤ 3; 0 ≤ Smax/σ0 ≤ 0.8
 * @source Newman, International Journal of Fracture 24 (1984) (from memory)
 * @example openingLevel(0, 3, 0.3) // 0.245376975151
 */
export function openingLevel(
  stressRatio: number,
  constraint: number,
  stressOverFlow: number,
): number {
  const a0 =
    (0.825 - 0.34 * constraint + 0.05 * constraint ** 2) *
    Math.cos((Math.PI / 2) * stressOverFlow) ** (1 / constraint);
  const a1 = (0.415 - 0.071 * constraint) * stressOverFlow;
  if (stressRatio < 0) return a0 + a1 * stressRatio;
  const a3 = 2 * a0 + a1 - 1;
  const a2 = 1 - a0 - a1 - a3;
  return Math.max(stressRatio, a0 + stressRatio * (a1 + stressRatio * (a2 + stressRatio * a3)));
}

/**
 * Part of the range in which the crack is open, by Newman: (1 − f)/(1 − R).
 * @param stressRatio minimum over maximum, R [-]
 * @param constraint α, 1 in plane stress to 3 in plane strain [-]
 * @param stressOverFlow largest stress over flow stress [-]
 * @returns ΔKeff/ΔK [-]
 * @validity −2 ≤ R < 1; 1 ≤ α ≤ 3; 0 ≤ Smax/σ0 ≤ 0.8
 * @source Newman, International Journal of Fracture 24 (1984) (from memory)
 * @example newmanShare(0, 3, 0.3) // 0.754623024849
 */
export const newmanShare = (
  stressRatio: number,
  constraint: number,
  stressOverFlow: number,
): number => (1 - openingLevel(stressRatio, constraint, stressOverFlow)) / (1 - stressRatio);
