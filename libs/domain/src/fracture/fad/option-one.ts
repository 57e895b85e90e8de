/** What the diagram needs to know of the material [MPa]. */
export interface DiagramMaterial {
  readonly yieldMPa: number;
  readonly tensileMPa: number;
  readonly youngsModulusMPa: number;
  /** A yield plateau: the diagram then ends at Lr = 1. */
  readonly yieldPlateau: boolean;
}

/**
 * Cut-off of the diagram: (σY + σU)/(2 σY), or 1 for a material with a yield plateau.
 * @param material yield and tensile strength, modulus [MPa]
 * @returns largest Lr, Lr,max [-]
 * @validity σU ≥ σY > 0
 * @source BS 7910:2013 7.3 (from memory); end at 1 with a plateau: API 579-1 Part 9 (from memory)
 * @example lrMax({ yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: false }) // 1.2142857
 */
export function lrMax({ yieldMPa, tensileMPa, yieldPlateau }: DiagramMaterial): number {
  return yieldPlateau ? 1 : (yieldMPa + tensileMPa) / (2 * yieldMPa);
}

/**
 * Option 1 line of a material that yields continuously, followed past its cut-off so that searches stay
 * continuous: (1 + Lr²/2)^−½ [0.3 + 0.7 exp(−μ Lr⁶)], then f(1) Lr^((N−1)/(2N)).
 * @param lr load ratio, Lr [-]
 * @param material yield and tensile strength, modulus [MPa]
 * @returns height of the line, f [-]
 * @validity 0 ≤ Lr < Lr,max; no yield plateau
 * @source BS 7910:2013 7.3.3, R6 (from memory)
 * @example continuousLine(0.8, { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: false }) // 0.7828855122
 */
export function continuousLine(lr: number, material: DiagramMaterial): number {
  const mu = Math.min((0.001 * material.youngsModulusMPa) / material.yieldMPa, 0.6);
  const below = Math.min(lr, 1);
  const f = (0.3 + 0.7 * Math.exp(-mu * below ** 6)) / Math.sqrt(1 + (below * below) / 2);
  return lr <= 1 ? f : f * lr ** hardeningExponent(material);
}

/**
 * Option 1 line of a material with a yield plateau: (1 + Lr²/2)^−½ below 1, (λ + 1/(2λ))^−½ at 1, with
 * λ = 1 + E Δε/σY and Δε = 0.0375 (1 − 0.001 σY); it drops sharply at 1.
 * @param lr load ratio, Lr [-]
 * @param material yield and tensile strength, modulus [MPa]
 * @returns height of the line, f [-]
 * @validity σY ≤ 946 MPa
 * @source BS 7910:2013 7.3.3, SINTAP (from memory)
 * @example plateauLine(0.5, { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: true }) // 0.9428090416
 */
export function plateauLine(lr: number, material: DiagramMaterial): number {
  if (lr < 1) return 1 / Math.sqrt(1 + (lr * lr) / 2);
  const plateau = Math.max(0.0375 * (1 - 0.001 * material.yieldMPa), 0);
  const lambda = 1 + (material.youngsModulusMPa * plateau) / material.yieldMPa;
  const atOne = 1 / Math.sqrt(lambda + 1 / (2 * lambda));
  return atOne * lr ** hardeningExponent(material);
}

// (N − 1)/(2N) with N = 0.3 (1 − σY/σU); without hardening the line falls without bound
function hardeningExponent({ yieldMPa, tensileMPa }: DiagramMaterial): number {
  const n = 0.3 * (1 - yieldMPa / tensileMPa);
  return n > 0 ? (n - 1) / (2 * n) : -1e3;
}

/**
 * Option 1 line by the kind of yielding.
 * @param lr load ratio, Lr [-]
 * @param material yield and tensile strength, modulus [MPa]
 * @returns height of the line, f [-]
 * @validity 0 ≤ Lr < Lr,max
 * @source BS 7910:2013 7.3.3 (from memory)
 * @example optionOne(0, { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: false }) // 1
 */
export const optionOne = (lr: number, material: DiagramMaterial): number =>
  material.yieldPlateau ? plateauLine(lr, material) : continuousLine(lr, material);
