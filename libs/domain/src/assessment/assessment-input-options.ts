import type { Given } from '../units/provenance';

/** A flaw beside the assessed one, for the rules of interaction. */
export interface NeighbourInput {
  readonly name: string;
  readonly kind: 'surface' | 'embedded';
  readonly heightMm: Given;
  readonly lengthMm: Given;
  /** Ligament to the face the assessed flaw is measured from [mm]; null for a surface flaw. */
  readonly ligamentMm: Given | null;
  /** From centre to centre along the flaws, to either side [mm]. */
  readonly distanceMm: Given;
  /** Distance between the two planes [mm]. */
  readonly planeOffsetMm: Given;
}

/** Factors on the inputs for a wanted reliability; 1 changes nothing. */
export interface PartialFactorsInput {
  readonly stress: number;
  readonly size: number;
  /** Toughness is divided by it. */
  readonly toughness: number;
  /** Yield and tensile strength are divided by it. */
  readonly yield: number;
  /** Where the factors come from. */
  readonly note: string;
}

/** A solution chosen by hand instead of the automatic choice. */
export interface SolutionChoiceInput {
  readonly key: string;
  readonly reason: string;
}

/** What an assessment may add to the plain case; everything may be left out. */
export interface OptionsInput {
  readonly neighbours?: readonly NeighbourInput[] | null;
  /** Key of the rule of interaction; the default when left out. */
  readonly interactionRule?: string | null;
  readonly partialFactors?: PartialFactorsInput | null;
  readonly stressIntensityChoice?: SolutionChoiceInput | null;
  readonly referenceStressChoice?: SolutionChoiceInput | null;
}
