import type { FlawKind } from '../geometry/flaw-kind';
import type { Given } from '../units/provenance';
import type { OptionsInput } from './assessment-input-options';

/** The body that holds the flaw. A plate of width `null` is taken as wide against the flaw. */
export type WallInput =
  | { readonly shape: 'plate'; readonly thicknessMm: Given; readonly widthMm: Given | null }
  | {
      readonly shape: 'cylinder' | 'sphere';
      readonly thicknessMm: Given;
      readonly insideDiameterMm: Given;
    }
  | {
      /** A plate with a round hole from whose edge the flaw starts, at one side of the hole or at both. */
      readonly shape: 'hole edge';
      readonly thicknessMm: Given;
      readonly holeRadiusMm: Given;
      readonly widthMm: Given | null;
      readonly flawedSides: 'one' | 'both';
    }
  /** The inner corner where a nozzle meets the shell; the stress is that across the corner. */
  | {
      readonly shape: 'nozzle corner';
      readonly thicknessMm: Given;
      readonly holeRadiusMm: Given;
    }
  /** A round bar; its thickness is the diameter. */
  | { readonly shape: 'round bar'; readonly thicknessMm: Given };

/** The flaw as measured, before any sizing allowance. */
export interface FlawInput {
  readonly kind: FlawKind;
  /** Face a surface flaw opens to; for an embedded flaw the face its ligament is measured to. */
  readonly face: 'inside' | 'outside';
  /** Plane of the flaw in a cylinder; in a plate it is normal to the membrane stress and this is ignored. */
  readonly orientation: 'axial' | 'circumferential';
  /**
   * Through-wall extent [mm]: depth a of a surface or corner flaw, full height 2a of an embedded one. A flaw
   * through the wall or the edge has the wall's thickness and this is ignored.
   */
  readonly heightMm: Given;
  /** Length along the wall [mm]: 2c, or c measured from the edge for a corner or edge flaw and one at a hole. */
  readonly lengthMm: Given;
  /** Ligament p from an embedded flaw to `face` [mm]; null for a surface flaw. */
  readonly ligamentMm: Given | null;
}

/** What is added to the measured size before anything is computed. */
export interface SizingInput {
  /** Added to the through-wall extent [mm]; an embedded flaw's ligament shrinks by half of it. */
  readonly heightAllowanceMm: Given;
  /** Added to the length [mm]. */
  readonly lengthAllowanceMm: Given;
}

/** Residual stress normal to the flaw. */
export type ResidualStressInput =
  | { readonly state: 'none' }
  | { readonly state: 'entered'; readonly membraneMPa: Given; readonly bendingMPa: Given }
  /** Yield magnitude, relaxed by the primary load: min(yield, (1.4 − σref/σflow) yield). */
  | { readonly state: 'as-welded' }
  /** Yield magnitude, relaxed once by a proof test: the stress of that test normal to the flaw. */
  | { readonly state: 'proof-tested'; readonly membraneMPa: Given; readonly bendingMPa: Given }
  /** A polynomial through the wall, Σ sₙ (x/t)ⁿ, x from the flawed face [MPa]. */
  | { readonly state: 'profile'; readonly profileMPa: Given<readonly number[]> }
  /** 20 % of yield for a flaw parallel to the weld, 30 % for one transverse to it. */
  | { readonly state: 'heat-treated'; readonly flawToWeld: 'parallel' | 'transverse' };

/** Stress normal to the flaw plane at the governing load [MPa]. Bending is positive when the flawed face is in tension. */
export interface StressInput {
  readonly primaryMembraneMPa: Given;
  readonly primaryBendingMPa: Given;
  readonly residual: ResidualStressInput;
  /** Pressure acting on the faces of a crack open to the bore [MPa]; 0 or null when it does not reach them. */
  readonly crackFacePressureMPa: Given | null;
  /**
   * Primary stress as a polynomial through the wall, Σ sₙ (x/t)ⁿ to the fourth degree, x from the flawed face
   * [MPa]. Where it is given, membrane and bending are its linear part and the two inputs above are ignored.
   */
  readonly primaryProfileMPa?: Given<readonly number[]> | null;
  /**
   * Stress across the corner of a nozzle, concentration included, as a polynomial in x/t [MPa]: K is taken
   * from it, collapse from membrane and bending, as a peak yields without collapse.
   */
  readonly peakProfileMPa?: Given<readonly number[]> | null;
  /** Weld whose toe the flaw starts from: length of the attachment along the stress [mm]. */
  readonly weldToe?: { readonly attachmentLengthMm: Given } | null;
  /** Offset of the two walls at a butt weld; it adds bending to the primary membrane stress [mm]. */
  readonly offsetMm?: Given | null;
}

/** Material at the governing temperature. */
export interface MaterialInput {
  readonly yieldMPa: Given;
  readonly tensileMPa: Given;
  readonly youngsModulusMPa: Given;
  readonly poissonsRatio: Given;
  /** Fracture toughness Kmat [MPa·√m]. */
  readonly toughnessMPaSqrtM: Given;
  /** Whether the stress–strain curve has a yield plateau (no diagram beyond Lr = 1 is then claimed). */
  readonly yieldPlateau: boolean;
  /** Stress–strain curve, engineering values: the diagram is then Option 2. */
  readonly stressStrainCurve?: Given<readonly StressStrainPoint[]> | null;
}

/** One point of an engineering stress–strain curve. */
export interface StressStrainPoint {
  readonly strain: number;
  readonly stressMPa: number;
}

/** One straight piece of a two-stage Paris law, N and mm: da/dN [mm/cycle] = coefficient · ΔK^exponent, ΔK in MPa·√mm. */
export interface ParisStage {
  readonly coefficient: number;
  readonly exponent: number;
}

/** A fatigue growth law from the site's library, or a published one of another form, with its source. */
export interface FatigueLawInput {
  /** A published law that depends on more than ΔK; it is found by its key and its stages are empty. */
  readonly published?: boolean;
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** In order of ΔK: one stage (simplified law) or two that meet. */
  readonly stages: readonly ParisStage[];
  /** Below this ΔK nothing grows [MPa·√mm]; 0 for none. */
  readonly thresholdMPaSqrtMm: number;
}

/** One block of the operating histogram: how often per year a stress range is applied. */
export interface CycleBlockInput {
  readonly membraneRangeMPa: number;
  readonly bendingRangeMPa: number;
  readonly cyclesPerYear: number;
  readonly note: string;
  /** Least over greatest stress intensity of the cycle, residual stress included; left out: as at a weld. */
  readonly stressRatio?: number | null;
}

/** A law of growth with time that depends on K: a published one, or the plant's own power law. */
export type TimeLawInput =
  | { readonly kind: 'published'; readonly key: string }
  | {
      /** da/dt = coefficient · K^exponent, mm/year with K in MPa·√m, at most the plateau. */
      readonly kind: 'own';
      readonly coefficient: Given;
      readonly exponent: Given;
      /** Below this K nothing grows [MPa·√m]; 0 for none. */
      readonly thresholdMPaSqrtM: Given;
      readonly plateauMmPerYear: Given | null;
    };

/** A wall that corrodes evenly while the flaw grows. */
export interface ThinningInput {
  readonly rateMmPerYear: Given;
  /** Face that corrodes, seen from the flaw. */
  readonly face: 'cracked' | 'opposite';
}

/** What makes the flaw grow; both parts may be null (no growth expected). */
export interface GrowthInput {
  readonly fatigue: {
    readonly law: FatigueLawInput;
    readonly blocks: readonly CycleBlockInput[];
    /** Metal temperature of the cycles, for laws that depend on it [°C]. */
    readonly temperatureC?: Given | null;
  } | null;
  /** Constant (plateau) rates of stress corrosion: into the wall, and at each end along the surface [mm/year]. */
  readonly stressCorrosion: {
    readonly depthRateMmPerYear: Given;
    readonly endRateMmPerYear: Given;
  } | null;
  /** Growth with time by K, beside or instead of constant rates. */
  readonly withTime?: { readonly law: TimeLawInput; readonly temperatureC: Given } | null;
  readonly thinning?: ThinningInput | null;
}

/** Everything one assessment needs, in N and mm but for the fields that name another unit. */
export interface AssessmentInput extends OptionsInput {
  readonly wall: WallInput;
  readonly flaw: FlawInput;
  readonly sizing: SizingInput;
  readonly stress: StressInput;
  readonly material: MaterialInput;
  readonly growth: GrowthInput;
  /** Growth is followed no further than this [years]. */
  readonly horizonYears: number;
}
