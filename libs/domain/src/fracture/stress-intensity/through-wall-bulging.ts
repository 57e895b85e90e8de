// cubic of Zahoor's form turns beyond; held there
const TURNS = 11;

/**
 * Axial through-wall crack under pressure, K = σ F √(πc): F = √(1 + 0.52x + 1.29x² − 0.074x³).
 * @param x c/√(Rt), R the mean radius [-]
 * @returns factor F, exactly 1 without a crack [-]
 * @validity x ≤ 5 (range from memory)
 * @source Zahoor, as given in Anderson, Fracture Mechanics, solutions for cylinders
 * @example axialThroughFactor(10 / Math.sqrt(1000)) // 1.13626508917
 */
export function axialThroughFactor(x: number): number {
  const held = Math.min(x, TURNS);
  return Math.sqrt(1 + (0.52 + (1.29 - 0.074 * held) * held) * held);
}

/**
 * The same by shell theory, F = √(1 + 1.61x²).
 * @param x c/√(Rt), R the mean radius [-]
 * @returns factor F, exactly 1 without a crack [-]
 * @validity thin shell, short crack
 * @source Folias 1965 (from memory)
 * @example axialThroughFolias(1) // 1.61554944214
 */
export const axialThroughFolias = (x: number): number => Math.sqrt(1 + 1.61 * x * x);

/**
 * The same with a second term, F = √(1 + 1.255x² − 0.0135x⁴).
 * @param x c/√(Rt), R the mean radius [-]
 * @returns factor F, exactly 1 without a crack [-]
 * @validity x ≤ 5
 * @source Folias, as used for flawed pipe by Kiefner et al. 1973 (from memory)
 * @example axialThroughTwoTerms(1) // 1.49716398567
 */
export function axialThroughTwoTerms(x: number): number {
  const square = Math.min(x, 5) ** 2;
  return Math.sqrt(1 + (1.255 - 0.0135 * square) * square);
}

/**
 * The same, F = √(1 + 1.25x²) to x = 1, 0.6 + 0.9x beyond.
 * @param x c/√(Rt), R the mean radius [-]
 * @returns factor F, exactly 1 without a crack [-]
 * @validity x ≤ 5
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example axialThroughTada(2) // 2.4
 */
export const axialThroughTada = (x: number): number =>
  x <= 1 ? Math.sqrt(1 + 1.25 * x * x) : 0.6 + 0.9 * x;

/**
 * Through-wall crack in a sphere under pressure by shell theory, F = √(1 + 1.93x²).
 * @param x c/√(Rt), R the mean radius [-]
 * @returns factor F, exactly 1 without a crack [-]
 * @validity thin shell
 * @source Folias 1965 (from memory)
 * @example sphereThroughFactor(1) // 1.711724277
 */
export const sphereThroughFactor = (x: number): number => Math.sqrt(1 + 1.93 * x * x);
