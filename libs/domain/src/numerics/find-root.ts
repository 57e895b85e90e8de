/** How a search for a root ended: a value is only a root when the status says so. */
export interface RootResult {
  readonly status: 'found' | 'no sign change' | 'iteration limit' | 'not a number';
  readonly x: number;
  /** Half width of the bracket left around x. */
  readonly uncertainty: number;
  readonly evaluations: number;
}

export interface RootOptions {
  readonly tolerance?: number;
  readonly maxEvaluations?: number;
}

/**
 * Root of f between low and high by bracketed interpolation (inverse quadratic or secant, never
 * leaving the bracket) that falls back to bisection: a jump in f ends the search at the jump.
 * Answers how it stopped. Method: Brent 1973, Algorithms for Minimization without Derivatives.
 */
export function findRoot(
  f: (x: number) => number,
  low: number,
  high: number,
  { tolerance = 1e-12, maxEvaluations = 200 }: RootOptions = {},
): RootResult {
  let [a, b, fa, fb] = [low, high, f(low), f(high)];
  let evaluations = 2;
  const answer = (status: RootResult['status'], x: number, width: number): RootResult => ({
    status,
    x,
    uncertainty: Math.abs(width) / 2,
    evaluations,
  });
  if (Number.isNaN(fa) || Number.isNaN(fb)) return answer('not a number', Number.NaN, high - low);
  if (fa === 0) return answer('found', a, 0);
  if (fb === 0) return answer('found', b, 0);
  if (fa > 0 === fb > 0) return answer('no sign change', Number.NaN, high - low);
  let [c, fc, step, before] = [a, fa, b - a, b - a];
  for (;;) {
    if (fb > 0 === fc > 0) [c, fc, step, before] = [a, fa, b - a, b - a];
    if (Math.abs(fc) < Math.abs(fb)) [a, b, c, fa, fb, fc] = [b, c, b, fb, fc, fb];
    const enough = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
    const half = (c - b) / 2;
    if (Math.abs(half) <= enough || fb === 0) return answer('found', b, c - b);
    if (evaluations >= maxEvaluations) return answer('iteration limit', b, c - b);
    const trial = interpolate(a, b, c, fa, fb, fc);
    const useful = Math.abs(before) >= enough && Math.abs(fa) > Math.abs(fb);
    const inside =
      Math.abs(trial) < Math.min(1.5 * Math.abs(half) - enough / 2, Math.abs(before) / 2);
    [before, step] = useful && inside && trial * half > 0 ? [step, trial] : [half, half];
    [a, fa] = [b, fb];
    b += Math.abs(step) > enough ? step : Math.sign(half) * enough;
    fb = f(b);
    evaluations += 1;
    if (Number.isNaN(fb)) return answer('not a number', Number.NaN, c - a);
  }
}

/** Step from b to the root of the curve through the points: a secant when two coincide. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  const p = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  return -p / ((q - 1) * (r - 1) * (s - 1));
}
