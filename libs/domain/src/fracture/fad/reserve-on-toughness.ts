/**
 * Toughness given over toughness needed at one place of the front: Kmat (f(Lr) − ρ)/(KIp + KIs). Null when
 * the load ratio alone is at or beyond the line: no toughness would then do.
 * @param kTotal K from primary and secondary stress, KIp + KIs [MPa·√mm]
 * @param rho interaction term, ρ [-]
 * @param line height of the line at the load ratio, f(Lr) [-]
 * @param toughness fracture toughness, Kmat [MPa·√mm]
 * @returns reserve factor on toughness, or null [-]
 * @validity Lr < Lr,max
 * @source algebra of Kr = (KIp + KIs)/Kmat + ρ ≤ f(Lr)
 * @example reserveOnToughness(1000, 0, 0.8, 2000) // 1.6
 */
export function reserveOnToughness(
  kTotal: number,
  rho: number,
  line: number,
  toughness: number,
): number | null {
  const room = line - rho;
  if (!(room > 0)) return null;
  return kTotal > 0 ? (toughness * room) / kTotal : null;
}
