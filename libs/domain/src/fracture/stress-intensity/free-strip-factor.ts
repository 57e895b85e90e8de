import { stripCoefficient } from './strip-coefficient';

/**
 * Edge crack in a strip that is free to bend, uniform stress: F in K = F σ √(πa). No crack of that depth in a
 * plate or cylinder wall has more.
 * @param depth crack depth over thickness, α [-]
 * @returns factor F [-]
 * @validity α ≤ 0.9; held at 0.9 beyond
 * @source own fit of finite-element results, within 0.1 %
 * @example freeStripFactor(0.5) // 2.823544994
 */
export const freeStripFactor = (depth: number): number => stripCoefficient(0, depth);
