import { normalBelow, normalDensity, normalQuantile } from '../../numerics/normal-distribution';
import type { DetectionForm } from './detection-curve';

/** How a straight line over ln a becomes a probability of detection. */
export interface Link {
  readonly found: (eta: number) => number;
  readonly missed: (eta: number) => number;
  /** Slope of the probability. */
  readonly slope: (eta: number) => number;
  readonly inverse: (probability: number) => number;
  /** Spread over ln a of a line with slope b1. */
  readonly spread: (b1: number) => number;
}

const logistic = (eta: number) => 1 / (1 + Math.exp(-eta));

export const LINKS: Readonly<Record<DetectionForm, Link>> = {
  'log-logistic': {
    found: logistic,
    missed: (eta) => logistic(-eta),
    slope: (eta) => logistic(eta) * logistic(-eta),
    inverse: (p) => Math.log(p / (1 - p)),
    spread: (b1) => Math.PI / (Math.sqrt(3) * b1),
  },
  lognormal: {
    found: normalBelow,
    missed: (eta) => normalBelow(-eta),
    slope: normalDensity,
    inverse: normalQuantile,
    spread: (b1) => 1 / b1,
  },
};
