import { gamma } from '../../numerics/log-gamma';
import type { Distribution } from './distribution';
import { fromTails } from './from-tails';

/** Weibull distribution above a minimum; the characteristic value is exceeded with probability 1/e. */
export interface WeibullParameters {
  readonly minimum: number;
  readonly characteristic: number;
  readonly shape: number;
}

/**
 * Three-parameter Weibull distribution, F(x) = 1 − exp(−((x − min)/(x₀ − min))^m). Toughness in the
 * transition has min = 20 MPa·√m and m = 4 (master curve, ASTM E1921).
 */
export function weibull({ minimum, characteristic, shape }: WeibullParameters): Distribution {
  const scale = characteristic - minimum;
  const first = gamma(1 + 1 / shape);
  const hazard = (x: number) => (x > minimum ? ((x - minimum) / scale) ** shape : 0);
  return fromTails({
    mean: minimum + scale * first,
    sd: scale * Math.sqrt(gamma(1 + 2 / shape) - first * first),
    density: (x) => (x > minimum ? (shape / (x - minimum)) * hazard(x) * Math.exp(-hazard(x)) : 0),
    below: (x) => -Math.expm1(-hazard(x)),
    above: (x) => Math.exp(-hazard(x)),
    atLower: (p) => minimum + scale * (-Math.log1p(-p)) ** (1 / shape),
    atUpper: (q) => minimum + scale * (-Math.log(q)) ** (1 / shape),
  });
}

/** Exponential distribution of the given mean: a Weibull distribution of shape 1 from zero. */
export const exponential = (mean: number): Distribution =>
  weibull({ minimum: 0, characteristic: mean, shape: 1 });
