import { exp, log, LOG_GREATEST, LOG_LEAST } from '../../numerics/exp-log';

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
  takePowers(lanes, from, to);
  longCracks(lanes, from, to);
  deepCracks(lanes, from, to);
  const { work, lnKDeepest, lnKEnd } = lanes;
  for (let i = from; i < to; i++) {
    lnKDeepest[i] = log(work[3 * i] as number);
    lnKEnd[i] = log(work[3 * i + 1] as number);
  }
}

/** Depth, r^0.25 and r^1.65 of every crack. */
function takePowers(
  { lnDepth, lnAspect, lnThickness, deep, work }: EndsLanes,
  from: number,
  to: number,
): void {
  for (let i = from; i < to; i++) {
    const aspect = lnAspect[i] as number;
    const lnR = deep[i] === 0 ? aspect : -aspect;
    work[3 * i] = exp((lnDepth[i] as number) - (lnThickness[i] as number));
    work[3 * i + 1] = exp(0.25 * lnR);
    work[3 * i + 2] = exp(1.65 * lnR);
  }
}

/** K of those with a ≤ c in place of the first two exponentials. */
function longCracks(lanes: EndsLanes, from: number, to: number): void {
  const { thickness, inverseWidth, membrane, bending, deep, work } = lanes;
  for (let i = from; i < to; i++) {
    if (deep[i] !== 0) continue;
    const depth = work[3 * i] as number;
    const r25 = work[3 * i + 1] as number;
    const rootR = r25 * r25;
    const r = rootR * rootR;
    const r75 = r25 * rootR;
    const depth2 = depth * depth;
    const rest2 = (1 - r) * (1 - r);
    const rest4 = rest2 * rest2;
    const rest8 = rest4 * rest4;
    const near = 0.2 + r;
    const far = 0.65 + r;
    const shared = 1 / (near * far);
    const m2 = -0.54 + 0.89 * far * shared;
    const m3 = 0.5 - near * shared + 14 * (rest8 * rest8 * rest8);
    const tension = 1.13 - 0.09 * r + (m2 + m3 * depth2) * depth2;
    const h1 = 1 - (0.34 + 0.11 * r) * depth;
    const h2 = 1 + ((0.55 - 1.05 * r75 + 0.47 * r75 * r75) * depth - 1.22 - 0.12 * r) * depth;
    const a = depth * (thickness[i] as number);
    const q = 1 + 1.464 * (work[3 * i + 2] as number);
    const cosine = widthCosine((a / r) * (inverseWidth[i] as number), depth);
    const k = Math.sqrt((Math.PI * a) / (q * cosine)) * tension;
    const sm = membrane[i] as number;
    const sb = bending[i] as number;
    work[3 * i] = bounded(k * (sm + h2 * sb));
    work[3 * i + 1] = bounded(k * rootR * (1.1 + 0.35 * depth2) * (sm + h1 * sb));
  }
}

/** K of those with a > c, likewise. */
function deepCracks(lanes: EndsLanes, from: number, to: number): void {
  const { thickness, inverseWidth, membrane, bending, deep, work } = lanes;
  for (let i = from; i < to; i++) {
    if (deep[i] === 0) continue;
    const depth = work[3 * i] as number;
    const r25 = work[3 * i + 1] as number;
    const rootR = r25 * r25;
    const r = rootR * rootR;
    const r75 = r25 * rootR;
    const r15 = r75 * r75;
    const depth2 = depth * depth;
    const r4 = r * r * (r * r);
    const tension = rootR * (1 + 0.04 * r) + (0.2 - 0.11 * depth2) * r4 * depth2;
    const h1 = 1 + ((0.55 - 1.93 * r75 + 1.38 * r15) * depth - 0.04 - 0.41 * r) * depth;
    const h2 = 1 + ((0.55 - 0.72 * r75 + 0.14 * r15) * depth - 2.11 + 0.77 * r) * depth;
    const a = depth * (thickness[i] as number);
    const q = 1 + 1.464 * (work[3 * i + 2] as number);
    const cosine = widthCosine(a * r * (inverseWidth[i] as number), depth);
    const k = Math.sqrt((Math.PI * a) / (q * cosine)) * tension;
    const sm = membrane[i] as number;
    const sb = bending[i] as number;
    work[3 * i] = bounded(k * rootR * (sm + h2 * sb));
    work[3 * i + 1] = bounded(k * (1.1 + 0.35 * r * depth2) * (sm + h1 * sb));
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
  const x2 = x * x;
  return 1 + x * C1 + x2 * (C2 + x * C3 + x2 * (C4 + x * C5 + x2 * (C6 + x * C7)));
}
