import { expEach, LOG_GREATEST, LOG_LEAST, logEach } from '../../numerics/exp-log';

/** Many cracks side by side, a list for each quantity: what `plateSurfaceEnds` reads and writes. */
export interface EndsLanes {
  readonly thickness: Float64Array;
  readonly lnThickness: Float64Array;
  /** 1/W, 0 for a wide plate [1/mm]. */
  readonly inverseWidth: Float64Array;
  readonly membrane: Float64Array;
  readonly bending: Float64Array;
  /** ln a. */
  readonly lnDepth: Float64Array;
  /** ln(a/c). */
  readonly lnAspect: Float64Array;
  /** 1 for the equations of a > c, 0 for those of a ≤ c: held by the caller, so that a step stays on one side. */
  readonly deep: Uint8Array;
  /** The answer: ln K at the deepest point and at the end. */
  readonly lnKDeepest: Float64Array;
  readonly lnKEnd: Float64Array;
  /** Room for exponentials on their way, three for each crack. */
  readonly work: Float64Array;
}

/** Lists for a number of cracks. */
export function endsLanes(width: number): EndsLanes {
  const list = () => new Float64Array(width);
  return {
    thickness: list(),
    lnThickness: list(),
    inverseWidth: list(),
    membrane: list(),
    bending: list(),
    lnDepth: list(),
    lnAspect: list(),
    deep: new Uint8Array(width),
    lnKDeepest: list(),
    lnKEnd: list(),
    work: new Float64Array(3 * width),
  };
}

/** A closed crack, K ≤ 0, counts as this [MPa·√mm]. */
export const LEAST_K = LOG_LEAST;

/**
 * ln K of the semi-elliptical surface cracks `from` to `to` (not included) at the deepest point and the end: the
 * equations of `plateSurfaceInfluence` at 90° and 0° without a power function, and without allocation.
 */
export function plateSurfaceEnds(lanes: EndsLanes, from: number, to: number): void {
  const { lnDepth, lnAspect, lnThickness, deep, work, lnKDeepest, lnKEnd } = lanes;
  const count = to - from;
  for (let i = from, j = 0; j < count; i++, j++) {
    const aspect = lnAspect[i] as number;
    const lnR = deep[i] === 0 ? aspect : -aspect;
    work[j] = (lnDepth[i] as number) - (lnThickness[i] as number);
    work[count + j] = lnR;
    work[2 * count + j] = 1.65 * lnR;
  }
  expEach(work, 3 * count);
  longCracks(lanes, from, count);
  deepCracks(lanes, from, count);
  logEach(work, 2 * count);
  for (let i = from, j = 0; j < count; i++, j++) {
    lnKDeepest[i] = work[j] as number;
    lnKEnd[i] = work[count + j] as number;
  }
}

/** K of those with a ≤ c in place of the first two exponentials. */
function longCracks(lanes: EndsLanes, from: number, count: number): void {
  const { thickness, inverseWidth, membrane, bending, deep, work } = lanes;
  for (let i = from, j = 0; j < count; i++, j++) {
    if (deep[i] !== 0) continue;
    const depth = work[j] as number;
    const r = work[count + j] as number;
    const rootR = Math.sqrt(r);
    const r75 = rootR * Math.sqrt(rootR);
    const depth2 = depth * depth;
    const rest2 = (1 - r) * (1 - r);
    const rest4 = rest2 * rest2;
    const rest8 = rest4 * rest4;
    const m2 = -0.54 + 0.89 / (0.2 + r);
    const m3 = 0.5 - 1 / (0.65 + r) + 14 * (rest8 * rest8 * rest8);
    const tension = 1.13 - 0.09 * r + (m2 + m3 * depth2) * depth2;
    const h1 = 1 - (0.34 + 0.11 * r) * depth;
    const h2 = 1 + ((0.55 - 1.05 * r75 + 0.47 * r75 * r75) * depth - 1.22 - 0.12 * r) * depth;
    const a = depth * (thickness[i] as number);
    const q = 1 + 1.464 * (work[2 * count + j] as number);
    const cosine = widthCosine((a / r) * (inverseWidth[i] as number), depth);
    const k = Math.sqrt((Math.PI * a) / (q * cosine)) * tension;
    const sm = membrane[i] as number;
    const sb = bending[i] as number;
    work[j] = bounded(k * (sm + h2 * sb));
    work[count + j] = bounded(k * rootR * (1.1 + 0.35 * depth2) * (sm + h1 * sb));
  }
}

/** K of those with a > c, likewise. */
function deepCracks(lanes: EndsLanes, from: number, count: number): void {
  const { thickness, inverseWidth, membrane, bending, deep, work } = lanes;
  for (let i = from, j = 0; j < count; i++, j++) {
    if (deep[i] === 0) continue;
    const depth = work[j] as number;
    const r = work[count + j] as number;
    const rootR = Math.sqrt(r);
    const r75 = rootR * Math.sqrt(rootR);
    const r15 = r75 * r75;
    const depth2 = depth * depth;
    const r4 = r * r * (r * r);
    const tension = rootR * (1 + 0.04 * r) + (0.2 - 0.11 * depth2) * r4 * depth2;
    const h1 = 1 + ((0.55 - 1.93 * r75 + 1.38 * r15) * depth - 0.04 - 0.41 * r) * depth;
    const h2 = 1 + ((0.55 - 0.72 * r75 + 0.14 * r15) * depth - 2.11 + 0.77 * r) * depth;
    const a = depth * (thickness[i] as number);
    const q = 1 + 1.464 * (work[2 * count + j] as number);
    const cosine = widthCosine(a * r * (inverseWidth[i] as number), depth);
    const k = Math.sqrt((Math.PI * a) / (q * cosine)) * tension;
    const sm = membrane[i] as number;
    const sb = bending[i] as number;
    work[j] = bounded(k * rootR * (sm + h2 * sb));
    work[count + j] = bounded(k * (1.1 + 0.35 * r * depth2) * (sm + h1 * sb));
  }
}

const bounded = (k: number) => (k < LEAST_K ? LEAST_K : k > LOG_GREATEST ? LOG_GREATEST : k);

// 1/(2n)! with alternating sign, for the square of the argument
const [C1, C2, C3, C4] = [-1 / 2, 1 / 24, -1 / 720, 1 / 40320] as const;
const [C5, C6, C7] = [-1 / 3628800, 1 / 479001600, -1 / 87178291200] as const;

/** cos(π (c/W) √(a/t)), by its series to the last bits within 2c/W ≤ 0.5; above 0 whatever a trial step gives. */
function widthCosine(share: number, depth: number): number {
  const s = share < 0.4 ? share : 0.4;
  const x = Math.PI * Math.PI * s * s * (depth < 1 ? depth : 1);
  return 1 + x * (C1 + x * (C2 + x * (C3 + x * (C4 + x * (C5 + x * (C6 + x * C7))))));
}
