/** One straight piece of a growth law in the double-logarithmic plot; N and mm. */
export interface LawStage {
  readonly coefficient: number;
  readonly exponent: number;
}

/** A fatigue growth law: one piece, or several that meet, in order of ΔK; nothing grows below the threshold. */
export interface GrowthLaw {
  readonly stages: readonly LawStage[];
  /** Threshold of ΔK [MPa·√mm]. */
  readonly thresholdMPaSqrtMm: number;
}

/**
 * Range of stress intensity at which two pieces of a law meet: (A1/A2)^(1/(m2 − m1)).
 * @param lower piece below the transition, A in mm/cycle with ΔK in MPa·√mm [-]
 * @param upper piece above it, same units [-]
 * @returns transition ΔK [MPa·√mm]
 * @validity exponents differ
 * @source algebra of two straight lines
 * @example transition({ coefficient: 2.1e-17, exponent: 5.1 }, { coefficient: 1.29e-12, exponent: 2.88 }) // 143.5
 */
export function transition(lower: LawStage, upper: LawStage): number {
  return (lower.coefficient / upper.coefficient) ** (1 / (upper.exponent - lower.exponent));
}

/**
 * Growth per cycle of a law of one or several stages with a threshold.
 * @param law stages in order of ΔK, and the threshold [MPa·√mm]
 * @returns function from ΔK [MPa·√mm] to da/dN [mm/cycle]
 * @validity ΔK ≥ 0; Kmax below toughness is the diagram's concern, not the law's
 * @source Paris and Erdogan 1963; two-stage form of BS 7910
 * @example growthPerCycle({ stages: [{ coefficient: 5.21e-13, exponent: 3 }], thresholdMPaSqrtMm: 0 })(1000) // 0.000521
 */
export function growthPerCycle(law: GrowthLaw): (range: number) => number {
  const { stages, thresholdMPaSqrtMm } = law;
  const bounds = stages.map((stage, i) => {
    const next = stages[i + 1];
    return next ? transition(stage, next) : Number.POSITIVE_INFINITY;
  });
  return (range) => {
    if (!(range > 0) || range < thresholdMPaSqrtMm) return 0;
    let i = 0;
    while (i < bounds.length - 1 && range > (bounds[i] ?? 0)) i++;
    const stage = stages[i];
    return stage ? stage.coefficient * range ** stage.exponent : 0;
  };
}
