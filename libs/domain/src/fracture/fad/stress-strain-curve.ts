/** A place where strain grows at one stress. */
export interface CurveStep {
  readonly stressMPa: number;
  /** Secant ratio just below the stress, and at the end of the step. */
  readonly before: number;
  readonly after: number;
}

/** A true stress–strain curve, as the diagram reads it. */
export interface StressStrainCurve {
  readonly title: string;
  readonly source: string;
  /** Strain over elastic strain at a true stress, E ε/σ: 1 where the material is elastic, never below. */
  readonly secantRatio: (stressMPa: number) => number;
  /** True stress of the last point; the curve claims nothing beyond. */
  readonly lastStressMPa: number;
  readonly steps: readonly CurveStep[];
}

/**
 * True strain of an engineering strain, ln(1 + e).
 * @param strain engineering strain, e [-]
 * @returns true strain, ε [-]
 * @validity up to the start of necking
 * @source definition, constant volume
 * @example trueStrain(0.1) // 0.0953101798
 */
export const trueStrain = (strain: number): number => Math.log1p(strain);

/**
 * True stress of an engineering stress, s (1 + e).
 * @param stress engineering stress, s [MPa]
 * @param strain engineering strain, e [-]
 * @returns true stress, σ [MPa]
 * @validity up to the start of necking
 * @source definition, constant volume
 * @example trueStress(400, 0.1) // 440
 */
export const trueStress = (stress: number, strain: number): number => stress * (1 + strain);

/** Constants of a Ramberg–Osgood curve. */
export interface RambergOsgood {
  readonly youngsModulusMPa: number;
  /** Stress the plastic strain is named at [MPa]. */
  readonly yieldMPa: number;
  readonly exponent: number;
  /** Plastic strain at that stress; 0.002 for a proof strength. */
  readonly plasticStrain: number;
}

/**
 * Ramberg–Osgood curve: ε = σ/E + εp (σ/σY)^n, εp the plastic strain at yield.
 * @param constants modulus, yield [MPa], exponent and plastic strain at yield [-]
 * @returns curve whose secant ratio is 1 + E εp σ^(n−1)/σY^n [-]
 * @validity n ≥ 1; a smooth curve, no yield plateau
 * @source Ramberg and Osgood, NACA TN 902 (1943); 0.2 % form
 * @example rambergOsgoodCurve({ youngsModulusMPa: 200000, yieldMPa: 400, exponent: 10, plasticStrain: 0.002 }).secantRatio(400) // 2
 */
export function rambergOsgoodCurve(constants: RambergOsgood): StressStrainCurve {
  const { youngsModulusMPa, yieldMPa, exponent, plasticStrain } = constants;
  const atYield = (youngsModulusMPa * plasticStrain) / yieldMPa;
  return {
    title: `Ramberg–Osgood, n = ${exponent}`,
    source: 'Ramberg and Osgood, NACA TN 902 (1943)',
    secantRatio: (stress) => 1 + atYield * (Math.max(stress, 0) / yieldMPa) ** (exponent - 1),
    lastStressMPa: Number.POSITIVE_INFINITY,
    steps: [],
  };
}
