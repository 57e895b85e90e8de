import { normalBelow, normalDensity, normalQuantile } from '../../numerics/normal-distribution';
import type { Distribution } from './distribution';
import { covOfLogSd, logSdOfCov } from './lognormal-scatter';

/** Lognormal distribution of the given mean and coefficient of variation. */
export function lognormal(mean: number, cov: number): Distribution {
  const sdOfLog = logSdOfCov(cov);
  return lognormalOfLog(Math.log(mean) - (sdOfLog * sdOfLog) / 2, sdOfLog);
}

/** Lognormal distribution by mean and standard deviation of the logarithm. */
export function lognormalOfLog(meanOfLog: number, sdOfLog: number): Distribution {
  const mean = Math.exp(meanOfLog + (sdOfLog * sdOfLog) / 2);
  const standard = (x: number) => (x > 0 ? (Math.log(x) - meanOfLog) / sdOfLog : -Infinity);
  return {
    mean,
    sd: mean * covOfLogSd(sdOfLog),
    density: (x) => (x > 0 ? normalDensity(standard(x)) / (x * sdOfLog) : 0),
    below: (x) => normalBelow(standard(x)),
    above: (x) => normalBelow(-standard(x)),
    quantile: (p) => Math.exp(meanOfLog + sdOfLog * normalQuantile(p)),
    fromNormal: (u) => Math.exp(meanOfLog + sdOfLog * u),
    toNormal: standard,
  };
}
