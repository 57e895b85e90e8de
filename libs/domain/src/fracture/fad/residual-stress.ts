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

/** Room-temperature yield strengths of a weld, and which metal holds the flaw. */
export interface WeldStrengths {
  readonly weldMPa: number;
  readonly parentMPa: number;
  readonly flawIn: 'weld' | 'parent';
}

/**
 * As-welded residual membrane stress: along the weld the yield strength of the metal that holds the flaw, across
 * it the lesser of weld and parent metal. The stress along the weld opens a flaw that lies across it.
 * @param stressToWeld direction of the stress to the weld, parallel or transverse [-]
 * @param strengths yield strengths at room temperature, and the metal that holds the flaw [MPa]
 * @returns uniform residual stress, Qm [MPa]
 * @validity as welded; strength at room temperature
 * @source BS 7910:2013 7.1.8.2 (from memory; form seen in a secondary source)
 * @example asWeldedResidual('parallel', { weldMPa: 420, parentMPa: 350, flawIn: 'weld' }) // 420
 */
export function asWeldedResidual(
  stressToWeld: 'parallel' | 'transverse',
  { weldMPa, parentMPa, flawIn }: WeldStrengths,
): number {
  if (stressToWeld === 'transverse') return Math.min(weldMPa, parentMPa);
  return flawIn === 'weld' ? weldMPa : parentMPa;
}

/** Added to the specified yield strength for the yield a residual stress may reach [MPa] (API 579-1, from memory). */
const API_ALLOWANCE = 69;

/**
 * Yield strength a residual stress may reach where only the specified minimum is known: σY + 69 MPa.
 * @param specifiedYield specified minimum yield strength, σY [MPa]
 * @returns yield strength for residual stress [MPa]
 * @validity carbon and low-alloy steel
 * @source API 579-1 Annex 9D (from memory)
 * @example residualYield(250) // 319
 */
export const residualYield = (specifiedYield: number): number => specifiedYield + API_ALLOWANCE;

/** What must be true for a proof test to count as a relief of residual stress. */
export const PROOF_TEST_CONDITIONS: readonly string[] = [
  'The wall was as welded before the test and was not welded or heat treated after it.',
  'The flaw, or its reference stress taken without it, was that of the day of the test.',
  'Strengths are those at the temperature of the test.',
  'The stress of the test acted in the direction of the assessed stress.',
];

/** Loads and strengths a proof test is judged by [MPa]. */
export interface ProofTest {
  /** Reference stress in the test, 0 without one. */
  readonly proofReference: number;
  /** Reference stress in service. */
  readonly serviceReference: number;
  readonly yieldMPa: number;
  readonly tensileMPa: number;
}

/**
 * Residual membrane stress after a proof test. Yielding under load relaxes for good, so the largest load so far
 * counts: the as-welded stress is relaxed by the greater of proof and service reference stress. The result is
 * thus never above, and usually below, what service alone leaves.
 * @param test reference stresses in the test and in service, strengths [MPa]
 * @returns uniform residual stress, Qm [MPa]
 * @validity the conditions of a proof test; R6 warns that validation of the relaxation is limited
 * @source BS 7910:2013 7.1.8.2 (from memory), at the reference stress of the proof test
 * @example proofTestedResidual({ proofReference: 300, serviceReference: 200, yieldMPa: 350, tensileMPa: 500 }) // 242.9411765
 */
export const proofTestedResidual = ({
  proofReference,
  serviceReference,
  yieldMPa,
  tensileMPa,
}: ProofTest): number =>
  relaxedResidual(Math.max(proofReference, serviceReference), yieldMPa, tensileMPa);
