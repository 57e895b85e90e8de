import type { Mm } from '../../units/quantity';

/**
 * Magnification of membrane stress at the toe of a weld, two-dimensional:
 * L/B ≤ 2: 0.51(L/B)^0.27 (z/B)^−0.31 to z/B = 0.05(L/B)^0.55, then 0.83(z/B)^(−0.15(L/B)^0.46);
 * L/B > 2: 0.615(z/B)^−0.31 to z/B = 0.073, then 0.83(z/B)^−0.20. Never below 1.
 * @param z depth of the point of the front, z [mm]
 * @param attachment length of the attachment along the stress, weld toes included, L [mm]
 * @param thickness plate thickness, B [mm]
 * @returns Mk [-]
 * @validity sharp toe at 45°, z > 0; the printed branches meet within 3 %, the rule itself jumps there
 * @source Maddox and Andrews 1990 in the form of BS 7910; coefficients as in the JCSS Probabilistic Model Code, fatigue annex
 * @example weldToeMembrane(mm(0.005), mm(1), mm(1)) // 2.63566054124
 */
export function weldToeMembrane(z: Mm, attachment: Mm, thickness: Mm): number {
  const length = attachment / thickness;
  const depth = z / thickness;
  const [factor, end, power] =
    length <= 2
      ? [0.51 * length ** 0.27, 0.05 * length ** 0.55, -0.15 * length ** 0.46]
      : [0.615, 0.073, -0.2];
  return Math.max(depth <= end ? factor * depth ** -0.31 : 0.83 * depth ** power, 1);
}

/**
 * Magnification of bending stress at the toe of a weld, two-dimensional:
 * L/B ≤ 1: 0.45(L/B)^0.21 (z/B)^−0.31 to z/B = 0.03(L/B)^0.55, then 0.68(z/B)^(−0.19(L/B)^0.21);
 * L/B > 1: as at 1. Never below 1.
 * @param z depth of the point of the front, z [mm]
 * @param attachment length of the attachment along the stress, weld toes included, L [mm]
 * @param thickness plate thickness, B [mm]
 * @returns Mk [-]
 * @validity sharp toe at 45°, z > 0; the printed branches meet within 2.5 %, the rule itself jumps there
 * @source Maddox and Andrews 1990 in the form of BS 7910; coefficients as in the JCSS Probabilistic Model Code, fatigue annex
 * @example weldToeBending(mm(0.01), mm(0.5), mm(1)) // 1.62179596171
 */
export function weldToeBending(z: Mm, attachment: Mm, thickness: Mm): number {
  const length = Math.min(attachment / thickness, 1);
  const depth = z / thickness;
  const end = 0.03 * length ** 0.55;
  const magnified =
    depth <= end
      ? 0.45 * length ** 0.21 * depth ** -0.31
      : 0.68 * depth ** (-0.19 * length ** 0.21);
  return Math.max(magnified, 1);
}
