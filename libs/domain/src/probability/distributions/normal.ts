import { normalBelow, normalDensity, normalQuantile } from '../../numerics/normal-distribution';
import type { Distribution } from './distribution';

/** Normal distribution of the given mean and standard deviation. */
export function normal(mean: number, sd: number): Distribution {
  const standard = (x: number) => (x - mean) / sd;
  return {
    mean,
    sd,
    density: (x) => normalDensity(standard(x)) / sd,
    below: (x) => normalBelow(standard(x)),
    above: (x) => normalBelow(-standard(x)),
    quantile: (p) => mean + sd * normalQuantile(p),
    fromNormal: (u) => mean + sd * u,
    toNormal: standard,
  };
}
