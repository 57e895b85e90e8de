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
 * Strength of the drop of the line below yield: μ = min(0.001 E/σY, 0.6).
 * @param material yield strength and modulus [MPa]
 * @returns μ [-]
 * @validity no yield plateau
 * @source BS 7910:2013 7.3.3, R6 (from memory)
 * @example dropStrength({ yieldMPa: 400, tensileMPa: 500, youngsModulusMPa: 200000, yieldPlateau: false }) // 0.5
 */
export const dropStrength = ({ yieldMPa, youngsModulusMPa }: DiagramMaterial): number =>
  Math.min((0.001 * youngsModulusMPa) / yieldMPa, 0.6);

/**
 * Strain hardening exponent estimated from the strengths: N = 0.3 (1 − σY/σU).
 * @param material yield and tensile strength [MPa]
 * @returns N, 0 without hardening [-]
 * @validity σU ≥ σY
 * @source BS 7910:2013 7.3.3, SINTAP (from memory)
 * @example hardening({ yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: false }) // 0.09
 */
export const hardening = ({ yieldMPa, tensileMPa }: DiagramMaterial): number =>
  0.3 * (1 - yieldMPa / tensileMPa);

/**
 * Length of the yield plateau estimated from the yield strength: Δε = 0.0375 (1 − 0.001 σY), not below 0.
 * @param yieldStrength upper yield strength, σY [MPa]
 * @returns strain of the plateau, Δε [-]
 * @validity σY ≤ 946 MPa
 * @source BS 7910:2013 7.3.3, SINTAP (from memory; one secondary source has 0.037)
 * @example plateauStrain(350) // 0.024375
 */
export const plateauStrain = (yieldStrength: number): number =>
  Math.max(0.0375 * (1 - 0.001 * yieldStrength), 0);

/**
 * Strain at the end of the plateau over elastic strain: λ = 1 + E Δε/σY.
 * @param material yield strength and modulus [MPa]
 * @returns λ [-]
 * @validity σY ≤ 946 MPa
 * @source BS 7910:2013 7.3.3, SINTAP (from memory)
 * @example plateauRatio({ yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, yieldPlateau: true }) // 15.4160714286
 */
export const plateauRatio = ({ yieldMPa, youngsModulusMPa }: DiagramMaterial): number =>
  1 + (youngsModulusMPa * plateauStrain(yieldMPa)) / yieldMPa;

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
  const mu = dropStrength(material);
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
  const lambda = plateauRatio(material);
  const atOne = 1 / Math.sqrt(lambda + 1 / (2 * lambda));
  return atOne * lr ** hardeningExponent(material);
}

// (N − 1)/(2N); without hardening the line falls without bound
function hardeningExponent(material: DiagramMaterial): number {
  const n = hardening(material);
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
