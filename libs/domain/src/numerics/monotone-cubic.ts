/** A curve through points, with the range it holds for. */
export interface MonotoneCurve {
  readonly from: number;
  readonly to: number;
  /** Value at x; x outside the range is taken at its end. */
  readonly at: (x: number) => number;
}

/**
 * Smooth curve through points of strictly increasing x that neither overshoots nor turns between two points:
 * piecewise cubic with harmonic mean slopes (Fritsch and Butland 1984; one-sided ends after Moler 2004).
 * Needs at least two points; straight where the points are.
 */
export function monotoneCubic(xs: readonly number[], ys: readonly number[]): MonotoneCurve {
  const slopes = slopesOf(xs, ys);
  const last = xs.length - 1;
  const [from, to] = [value(xs, 0), value(xs, last)];
  const at = (x: number): number => {
    const clamped = Math.min(Math.max(x, from), to);
    const i = intervalOf(xs, clamped);
    const width = value(xs, i + 1) - value(xs, i);
    const t = (clamped - value(xs, i)) / width;
    const [y0, y1] = [value(ys, i), value(ys, i + 1)];
    const [d0, d1] = [width * value(slopes, i), width * value(slopes, i + 1)];
    // y0 + (y1 − y0) times the smooth step, plus the slopes: exact at both ends
    const rest = 1 - t;
    return y0 + (y1 - y0) * t * t * (3 - 2 * t) + t * rest * (rest * d0 - t * d1);
  };
  return { from, to, at };
}

/** Last interval whose start is not beyond x. */
function intervalOf(xs: readonly number[], x: number): number {
  let [low, high] = [0, xs.length - 2];
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (value(xs, middle) <= x) low = middle;
    else high = middle - 1;
  }
  return low;
}

function slopesOf(xs: readonly number[], ys: readonly number[]): readonly number[] {
  const widths = differences(xs);
  const secants = differences(ys).map((rise, i) => rise / value(widths, i));
  if (secants.length === 1) return [value(secants, 0), value(secants, 0)];
  const last = secants.length - 1;
  const inner = secants.slice(1).map((after, i) => {
    const before = value(secants, i);
    if (before * after <= 0) return 0;
    const [h0, h1] = [value(widths, i), value(widths, i + 1)];
    const [w0, w1] = [2 * h1 + h0, h1 + 2 * h0];
    return (w0 + w1) / (w0 / before + w1 / after);
  });
  return [
    endSlope(value(widths, 0), value(widths, 1), value(secants, 0), value(secants, 1)),
    ...inner,
    endSlope(
      value(widths, last),
      value(widths, last - 1),
      value(secants, last),
      value(secants, last - 1),
    ),
  ];
}

// a parabola through three points, held back where it would turn
function endSlope(h0: number, h1: number, near: number, next: number): number {
  const slope = ((2 * h0 + h1) * near - h0 * next) / (h0 + h1);
  if (slope * near <= 0) return 0;
  return near * next <= 0 && Math.abs(slope) > 3 * Math.abs(near) ? 3 * near : slope;
}

const differences = (values: readonly number[]): readonly number[] =>
  values.slice(1).map((after, i) => after - value(values, i));

const value = (values: readonly number[], i: number): number => values[i] ?? Number.NaN;
