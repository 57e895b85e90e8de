/** CPU seconds of this process that a piece of work takes. */
export function cpuSeconds(work: () => void): number {
  const before = process.cpuUsage();
  work();
  const { user } = process.cpuUsage(before);
  return user / 1e6;
}

/** A quantile of a list of numbers. */
export function quantile(values: Iterable<number>, share: number): number {
  const sorted = [...values].sort((x, y) => x - y);
  return sorted[Math.min(Math.floor(share * sorted.length), sorted.length - 1)] ?? Number.NaN;
}

/** Median and quartiles in words. */
export const spread = (values: readonly number[], digits = 2): string =>
  `${quantile(values, 0.5).toFixed(digits)} [${quantile(values, 0.25).toFixed(digits)}–${quantile(values, 0.75).toFixed(digits)}]`;

/** Median, 99 % and worst of the relative errors against a reference. */
export function errors(values: ArrayLike<number>, reference: ArrayLike<number>) {
  const apart = Array.from(values, (x, i) => Math.abs(x / (reference[i] ?? 0) - 1));
  return { median: quantile(apart, 0.5), most: quantile(apart, 0.99), worst: quantile(apart, 1) };
}
