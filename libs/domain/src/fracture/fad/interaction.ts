// beyond this the polynomial would bend back; it meets 0.25 (0.2493) there
const CHI_END = 5.2;

/** χ up to which BS 7910 keeps the simple form; R6 goes on to 5.2 (both from memory). */
export const CHI_SIMPLE_LIMIT = 4;

/**
 * Weight of secondary stress against primary, χ = KIs Lr / KIp.
 * @param kPrimary K from primary stress, KIp [MPa·√mm]
 * @param kSecondary K from secondary stress, KIs [MPa·√mm]
 * @param lr load ratio, Lr [-]
 * @returns χ; Infinity without primary K [-]
 * @validity KIs > 0
 * @source JCSS Probabilistic Model Code Part 3.12, before equation 3.13
 * @example chi(100, 100, 0.5) // 0.5
 */
export function chi(kPrimary: number, kSecondary: number, lr: number): number {
  return kPrimary > 0 ? (kSecondary * lr) / kPrimary : Number.POSITIVE_INFINITY;
}

/**
 * Plasticity interaction of secondary with primary stress, ρ: ρ1 = 0.1 χ^0.714 − 0.007 χ² + 3·10⁻⁵ χ⁵ to
 * Lr = 0.8, then 4 ρ1 (1.05 − Lr), and 0 from 1.05. Compressive secondary K gives 0.
 * @param kPrimary K from primary stress, KIp [MPa·√mm]
 * @param kSecondary K from secondary stress, KIs [MPa·√mm]
 * @param lr load ratio, Lr [-]
 * @returns interaction term, ρ [-]
 * @validity χ ≤ 4 (BS 7910), to 5.2 (R6); 0.25 beyond
 * @source JCSS Probabilistic Model Code Part 3.12, equations 3.13 and 3.14; BS 7910 and R6 limits from memory
 * @example interaction(100, 200, 0.5) // 0.09303
 */
export function interaction(kPrimary: number, kSecondary: number, lr: number): number {
  if (!(kSecondary > 0) || lr >= 1.05) return 0;
  const x = chi(kPrimary, kSecondary, lr);
  const rho = x < CHI_END ? 0.1 * x ** 0.714 - 0.007 * x * x + 3e-5 * x ** 5 : 0.25;
  return lr <= 0.8 ? rho : 4 * rho * (1.05 - lr);
}
