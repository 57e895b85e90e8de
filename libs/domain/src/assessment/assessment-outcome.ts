import type { FlawKind } from '../geometry/flaw-kind';
import type { Refusal } from '../geometry/refusal';

export type { Refusal };

/** One limit of a published solution, as met or not by this case. */
export interface ValidityCheck {
  readonly name: string;
  readonly limit: string;
  readonly value: number;
  readonly met: boolean;
  /** Met, but within 10 % of the limit. */
  readonly near: boolean;
  readonly source: string;
}

/** One step of the calculation sheet. */
export interface CalculationStep {
  /** Heading the step stands under, e.g. `Stress intensity`. */
  readonly group: string;
  readonly symbol: string;
  readonly name: string;
  readonly value: number | string;
  readonly unit: string;
  /** The formula in words or symbols. */
  readonly formula: string;
  readonly source: string;
  /** Symbols and values that went in, e.g. `a = 8.6 mm`. */
  readonly inputs: readonly string[];
}

/** K and the diagram point at one place of the crack front; φ = 90° is the deepest point. */
export interface FrontPoint {
  readonly angleDeg: number;
  readonly kPrimaryMPaSqrtM: number;
  readonly kSecondaryMPaSqrtM: number;
  readonly kr: number;
}

/** One state on the way of the growing flaw. */
export interface GrowthState {
  readonly years: number;
  readonly cycles: number;
  readonly kind: FlawKind;
  readonly heightMm: number;
  readonly lengthMm: number;
  /** Ligament of an embedded flaw to the nearer face; otherwise the wall left ahead of the flaw [mm]. */
  readonly ligamentMm: number;
  readonly kMaxMPaSqrtM: number;
  readonly kr: number;
  readonly lr: number;
}

/** Why growth is followed no further. */
export type GrowthEnd =
  | 'limit reached'
  | 'already at limit'
  | 'through-wall'
  | 'outside validity'
  | 'horizon'
  | 'no growth';

/** A change of category on the way, e.g. an embedded flaw breaking the surface. */
export interface GrowthEvent {
  readonly years: number;
  readonly from: 'surface' | 'embedded';
  /** The same as before when the flaw joins its neighbour. */
  readonly to: 'surface' | 'embedded' | 'through-wall';
  readonly heightBeforeMm: number;
  readonly heightAfterMm: number;
  readonly lengthAfterMm?: number;
  readonly rule: string;
}

/** How long the flaw stays acceptable. */
export interface RemainingLife {
  /** Years until the end [years], rounded down to 0.01; null when none exists (not acceptable now). */
  readonly years: number | null;
  readonly cycles: number | null;
  readonly end: GrowthEnd;
  /** In words, for a person. */
  readonly because: string;
  /** Years until the flaw first changes category, if it does before the end. */
  readonly firstEventYears: number | null;
}

export const VERDICTS = ['acceptable', 'near the limit', 'not acceptable'] as const;
export type Verdict = (typeof VERDICTS)[number];

/** The answer when every method is inside its limits. */
export interface AssessedFlaw {
  readonly status: 'assessed';
  readonly engineVersion: string;
  readonly verdict: Verdict;
  /** In words, the governing one first. */
  readonly reasons: readonly string[];
  readonly assessed: {
    readonly heightMm: number;
    /** a: depth of a surface flaw, half height of an embedded one [mm]. */
    readonly aMm: number;
    /** c: half length [mm]. */
    readonly cMm: number;
    readonly ligamentMm: number;
  };
  readonly solution: { readonly stressIntensity: string; readonly referenceStress: string };
  readonly residualMembraneMPa: number;
  readonly residualBendingMPa: number;
  readonly referenceStressMPa: number;
  readonly front: readonly FrontPoint[];
  /** Angle of the governing point [°]. */
  readonly governingAngleDeg: number;
  readonly kPrimaryMPaSqrtM: number;
  readonly kSecondaryMPaSqrtM: number;
  readonly kr: number;
  readonly lr: number;
  readonly lrMax: number;
  /** Which line of the diagram the flaw is judged by, e.g. `Option 1`. */
  readonly diagram?: string;
  /** That line as points from Lr = 0 to the cut-off, for drawing. */
  readonly line: readonly { readonly lr: number; readonly kr: number }[];
  /** Factor on primary load that brings the point to the line; below 1 when outside. */
  readonly reserveOnLoad: number;
  /** Factor on toughness: Kmat needed over Kmat given, as a reserve; below 1 when outside. Null when collapse alone governs. */
  readonly reserveOnToughness: number | null;
  /** Limiting through-wall extent at the present length [mm]; null when none inside validity. */
  readonly limitingHeightMm: number | null;
  /** Limiting length of a flaw through the wall or the edge [mm]; null for a flaw with a height of its own. */
  readonly limitingLengthMm?: number | null;
  readonly limitingBecause: string;
  readonly path: readonly GrowthState[];
  readonly events: readonly GrowthEvent[];
  readonly life: RemainingLife;
  readonly checks: readonly ValidityCheck[];
  /** Things the reader must know though they do not stop the verdict. */
  readonly cautions: readonly string[];
  /** Paths of the inputs whose provenance is `assumed` or `standard default`. */
  readonly assumed: readonly string[];
  readonly sheet: readonly CalculationStep[];
}

/** The answer when a method's limit is broken or an input is impossible: no verdict, and why. */
export interface RefusedFlaw {
  readonly status: 'refused';
  readonly engineVersion: string;
  readonly refusals: readonly Refusal[];
}

/** What an assessment answers: a verdict with its trail, or a refusal with its reason. */
export type AssessmentOutcome = AssessedFlaw | RefusedFlaw;
