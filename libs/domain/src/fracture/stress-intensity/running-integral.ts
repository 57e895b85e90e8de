import { legendreRule } from '../../numerics/gauss-legendre';

/** ∫₀ˣ of a smooth function, kept at even steps with its slope. */
export interface RunningIntegral {
  readonly step: number;
  readonly sums: Float64Array;
  readonly slopes: Float64Array;
}

const RULE = legendreRule(6);

/** Integrates once, so that hot loops only read. */
export function runningIntegral(
  integrand: (x: number) => number,
  to: number,
  steps: number,
): RunningIntegral {
  const step = to / steps;
  const sums = new Float64Array(steps + 1);
  const slopes = Float64Array.from(sums, (_, i) => integrand(i * step));
  for (let i = 0; i < steps; i++) {
    let part = 0;
    for (const { node, weight } of RULE) part += weight * integrand((i + (node + 1) / 2) * step);
    sums[i + 1] = (sums[i] ?? 0) + (part * step) / 2;
  }
  return { step, sums, slopes };
}

/** The integral up to x, by the cubic through both ends of the step with their slopes. */
export function integralTo({ step, sums, slopes }: RunningIntegral, x: number): number {
  const last = sums.length - 2;
  const i = Math.min(Math.max(Math.floor(x / step), 0), last);
  const u = x / step - i;
  const low = sums[i] ?? 0;
  const rise = (sums[i + 1] ?? 0) - low;
  const lowSlope = (slopes[i] ?? 0) * step;
  const highSlope = (slopes[i + 1] ?? 0) * step;
  return (
    low +
    u *
      (lowSlope + u * (3 * rise - 2 * lowSlope - highSlope + u * (lowSlope + highSlope - 2 * rise)))
  );
}
