import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import type { Between, LawScope, ThresholdLine } from './crack-law';

const KSI = MPA_SQRT_MM_PER['ksi·√in'];
const MPA_SQRT_M = MPA_SQRT_MM_PER['MPa·√m'];

/** Lowest stress ratio worth the name: a peak that hardly opens the crack. */
export const LOWEST_RATIO = -1e6;
const HIGHEST_RATIO = 0.9999;

/** Any stress ratio a cycle with a tensile peak can have. */
export const ANY_RATIO: Between = [LOWEST_RATIO, HIGHEST_RATIO];

/** Scope with bounds in the units of the engine; wide where nothing is said. */
export const scope = ({
  range = [0, 10_000],
  ratio = ANY_RATIO,
  temperature = [-50, 100],
  safeBelowRatio = false,
}: {
  readonly range?: Between;
  readonly ratio?: Between;
  readonly temperature?: Between;
  readonly safeBelowRatio?: boolean;
}): LawScope => ({
  rangeMPaSqrtMm: range,
  stressRatio: ratio,
  temperatureC: temperature,
  safeBelowRatio,
});

/** Bounds given in MPa·√m. */
export const inMetres = ([min, max]: Between): Between => [min * MPA_SQRT_M, max * MPA_SQRT_M];

/** 63 for R ≥ 0.5, 170 − 214 R down to R = 0, 170 below; continuous. */
export const STEEL_IN_AIR: ThresholdLine = { atZero: 170, slope: 214, least: 63, most: 170 };

/** 5 (1 − 0.8 R) ksi·√in, 5 below R = 0. */
export const FERRITIC_IN_AIR: ThresholdLine = {
  atZero: 5 * KSI,
  slope: 4 * KSI,
  least: 0,
  most: 5 * KSI,
};

/** The same threshold at every stress ratio, as for welds. */
export const constantThreshold = (value: number): ThresholdLine => ({
  atZero: value,
  slope: 0,
  least: value,
  most: value,
});
