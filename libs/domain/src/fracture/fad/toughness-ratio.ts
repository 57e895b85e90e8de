import { interaction } from './interaction';

/** K of primary and secondary stress at one place of the front, and what it is held against. */
export interface RatioInput {
  /** K from primary stress, KIp [MPa·√mm]. */
  readonly kPrimary: number;
  /** K from secondary stress, KIs; compression counts as none [MPa·√mm]. */
  readonly kSecondary: number;
  /** Fracture toughness, Kmat [MPa·√mm]. */
  readonly toughness: number;
  /** Load ratio, Lr. */
  readonly lr: number;
}

/**
 * Toughness ratio with the interaction added: Kr = (KIp + KIs)/Kmat + ρ; compressive KIs counts as 0.
 * @param input KIp, KIs, Kmat [MPa·√mm] and Lr [-]
 * @returns toughness ratio, Kr [-]
 * @validity Kmat > 0
 * @source JCSS Probabilistic Model Code Part 3.12, equation 3.12; BS 7910:2013 7.3.6 (from memory)
 * @example toughnessRatio({ kPrimary: 60, kSecondary: 40, toughness: 150, lr: 0.6 }) // 0.7175311103
 */
export function toughnessRatio({ kPrimary, kSecondary, toughness, lr }: RatioInput): number {
  const secondary = Math.max(kSecondary, 0);
  return (kPrimary + secondary) / toughness + interaction(kPrimary, secondary, lr);
}

/**
 * Interaction as a factor on the secondary K: V = 1 + ρ Kmat/KIs; 1 where nothing secondary opens the crack.
 * @param input KIp, KIs, Kmat [MPa·√mm] and Lr [-]
 * @returns factor on KIs, V [-]
 * @validity Kmat > 0; the simple form of ρ stands behind it, not the tables of the detailed V
 * @source algebra: Kr is the same with ρ and with V
 * @example secondaryFactor({ kPrimary: 60, kSecondary: 40, toughness: 150, lr: 0.6 }) // 1.190741664
 */
export const secondaryFactor = ({ kPrimary, kSecondary, toughness, lr }: RatioInput): number =>
  kSecondary > 0 ? 1 + (interaction(kPrimary, kSecondary, lr) * toughness) / kSecondary : 1;

/**
 * Toughness ratio with the interaction as a factor: Kr = (KIp + V KIs)/Kmat.
 * @param input KIp, KIs, Kmat [MPa·√mm] and Lr [-]
 * @returns toughness ratio, Kr [-]
 * @validity Kmat > 0
 * @source R6, BS 7910:2013 Annex R (from memory), with V from ρ
 * @example toughnessRatioByFactor({ kPrimary: 60, kSecondary: 40, toughness: 150, lr: 0.6 }) // 0.7175311103
 */
export const toughnessRatioByFactor = (input: RatioInput): number =>
  (input.kPrimary + secondaryFactor(input) * Math.max(input.kSecondary, 0)) / input.toughness;
