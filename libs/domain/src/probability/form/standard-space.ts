import type { LimitState } from '../sampling/failure-probability';

/** A limit state in standard normal space, counting how often it is asked. */
export interface StandardSpace {
  readonly dimensions: number;
  readonly margin: (u: Float64Array) => number;
  readonly gradient: (u: Float64Array) => Float64Array;
  readonly sampleAt: (u: Float64Array) => Float64Array;
  readonly evaluations: () => number;
}

// central differences: the error goes with the square of the step, rounding with its inverse
const STEP = 1e-4;

export function standardSpace({ variables, margin }: LimitState): StandardSpace {
  let evaluations = 0;
  const sampleAt = (u: Float64Array) =>
    Float64Array.from(variables, ({ distribution }, k) => distribution.fromNormal(u[k] as number));
  const at = (u: Float64Array) => {
    evaluations += 1;
    return margin(sampleAt(u));
  };
  const gradient = (u: Float64Array) => {
    const moved = Float64Array.from(u);
    return u.map((centre, k) => {
      moved[k] = centre + STEP;
      const above = at(moved);
      moved[k] = centre - STEP;
      const below = at(moved);
      moved[k] = centre;
      return (above - below) / (2 * STEP);
    });
  };
  return {
    dimensions: variables.length,
    margin: at,
    gradient,
    sampleAt,
    evaluations: () => evaluations,
  };
}

export const dot = (a: Float64Array, b: Float64Array): number =>
  a.reduce((sum, each, k) => sum + each * (b[k] as number), 0);
export const length = (a: Float64Array): number => Math.hypot(...a);
export const scaled = (a: Float64Array, by: number): Float64Array => a.map((each) => each * by);
export const sum = (a: Float64Array, b: Float64Array, by = 1): Float64Array =>
  a.map((each, k) => each + by * (b[k] as number));
