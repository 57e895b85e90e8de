import type { Between } from './crack-law';

/** The same rate whatever K is, once K is at the threshold. */
export interface PlateauForm {
  readonly form: 'plateau';
  readonly rateMmPerYear: number;
}

/** C K^n, C in mm/year with K in MPa·√mm; at most the plateau when one is known. */
export interface PowerForm {
  readonly form: 'power';
  readonly coefficient: number;
  readonly exponent: number;
  readonly plateauMmPerYear: number | null;
}

/** exp(−Q/R (1/T − 1/Tref)) C (K − K0)^n; K0 is the threshold. */
export interface ThermalForm {
  readonly form: 'thermal';
  readonly coefficient: number;
  readonly exponent: number;
  readonly activationKJPerMol: number;
  readonly referenceC: number;
}

/** A law of growth with time, stress corrosion or the like, with its limits as data. */
export type TimeLaw = (PlateauForm | PowerForm | ThermalForm) & {
  readonly key: string;
  readonly title: string;
  readonly environment: string;
  readonly source: string;
  /** Nothing grows below this K, or at it in the thermal form; 0 where none is known [MPa·√mm]. */
  readonly thresholdMPaSqrtMm: number;
  readonly stressIntensityMPaSqrtMm: Between;
  readonly temperatureC: Between;
};
