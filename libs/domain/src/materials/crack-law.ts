/** Bounds, the first at most the second. */
export type Between = readonly [min: number, max: number];

/** Where a law holds. */
export interface LawScope {
  /** Range of stress intensity [MPa·√mm]. */
  readonly rangeMPaSqrtMm: Between;
  /** Minimum over maximum stress intensity [-]. */
  readonly stressRatio: Between;
  readonly temperatureC: Between;
  /** Below the stress ratio's lower bound the law grows faster than the metal: allowed, with a word. */
  readonly safeBelowRatio: boolean;
}

/** Threshold of ΔK that falls in a line with the stress ratio, between a least and a most [MPa·√mm]. */
export interface ThresholdLine {
  readonly atZero: number;
  /** Fall per unit of R. */
  readonly slope: number;
  readonly least: number;
  readonly most: number;
}

/** One power of ΔK: coefficient in mm/cycle with ΔK in MPa·√mm. */
export interface PowerOfRange {
  readonly coefficient: number;
  readonly exponent: number;
}

/** Straight pieces in the double-logarithmic plot, in order of ΔK. */
export interface StagesForm {
  readonly form: 'stages';
  readonly stages: readonly PowerOfRange[];
}

/** C (ΔK/(1 − R)^(1 − γ))^m; γ = 0 below R = 0, where only the tensile part opens the crack. */
export interface WalkerForm extends PowerOfRange {
  readonly form: 'walker';
  readonly gamma: number;
}

/** C ΔK^m/((1 − R) Kc − ΔK), C for Kc in MPa·√mm. */
export interface FormanForm extends PowerOfRange {
  readonly form: 'forman';
  readonly toughnessMPaSqrtMm: number;
}

/** C S(R) ΔK^m, S = 25.72 (2.88 − R)^−3.07. */
export interface FerriticAirForm extends PowerOfRange {
  readonly form: 'asme ferritic air';
}

/** Two pieces, each with its own scale by R; they meet where they are equal. */
export interface FerriticWaterForm {
  readonly form: 'asme ferritic water';
  readonly low: PowerOfRange;
  readonly high: PowerOfRange;
}

/** C(T) S(R) ΔK^m; the coefficient is what multiplies 10^f(T). */
export interface AusteniticAirForm extends PowerOfRange {
  readonly form: 'austenitic air';
}

/** C (U ΔK)^m, U = constant + slope R: part of the range in which the crack is open. */
export interface ElberForm extends PowerOfRange {
  readonly form: 'elber';
  readonly constant: number;
  readonly slope: number;
}

/** C (ΔK (1 − f)/(1 − R))^m, f the opening function of Newman. */
export interface NewmanForm extends PowerOfRange {
  readonly form: 'newman';
  /** 1 in plane stress to 3 in plane strain. */
  readonly constraint: number;
  /** Largest stress over flow stress. */
  readonly stressOverFlow: number;
}

export type LawForm =
  | StagesForm
  | WalkerForm
  | FormanForm
  | FerriticAirForm
  | FerriticWaterForm
  | AusteniticAirForm
  | ElberForm
  | NewmanForm;

/** A law of fatigue crack growth in any published form, with its limits as data. */
export type CrackLaw = LawForm & {
  readonly key: string;
  readonly title: string;
  readonly environment: string;
  readonly source: string;
  readonly threshold: ThresholdLine;
  readonly scope: LawScope;
};

/** No threshold is claimed. */
export const NO_THRESHOLD: ThresholdLine = { atZero: 0, slope: 0, least: 0, most: 0 };
