/** Share of yield left by post-weld heat treatment, by the flaw's direction to the weld. */
export const HEAT_TREATED_SHARE = { parallel: 0.2, transverse: 0.3 } as const;

/**
 * As-welded residual membrane stress relaxed by the primary load: min(σY, (1.4 − σref/σf) σY), not below 0,
 * with the flow stress σf = (σY + σU)/2.
 * @param reference reference stress of the primary load, σref [MPa]
 * @param yieldStrength yield strength, σY [MPa]
 * @param tensileStrength tensile strength, σU [MPa]
 * @returns uniform residual stress, Qm [MPa]
 * @validity σref ≥ 0; R6 warns that validation of the relaxation is limited
 * @source BS 7910:2013 7.1.8.2 (from memory; form seen in secondary sources)
 * @example relaxedResidual(300, 350, 500) // 242.9411765
 */
export function relaxedResidual(
  reference: number,
  yieldStrength: number,
  tensileStrength: number,
): number {
  const flow = (yieldStrength + tensileStrength) / 2;
  return Math.max(Math.min(yieldStrength, (1.4 - reference / flow) * yieldStrength), 0);
}

/**
 * Residual membrane stress left by post-weld heat treatment.
 * @param flawToWeld direction of the flaw to the weld, parallel or transverse [-]
 * @param yieldStrength yield strength, the lesser of weld and parent for a parallel flaw, σY [MPa]
 * @returns uniform residual stress, Qm [MPa]
 * @validity furnace heat treatment to code
 * @source BS 7910:2013 7.1.8.3 (from memory; form seen in secondary sources)
 * @example heatTreatedResidual('parallel', 350) // 70
 */
export const heatTreatedResidual = (
  flawToWeld: keyof typeof HEAT_TREATED_SHARE,
  yieldStrength: number,
): number => HEAT_TREATED_SHARE[flawToWeld] * yieldStrength;
