import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import { firstCrossing } from '../../numerics/first-crossing';

/** What ends the depth a flaw of some length may have. */
export const LOCUS_ENDS = ['line', 'validity', 'depth share', 'none acceptable'] as const;
export type LocusEnd = (typeof LOCUS_ENDS)[number];

/** One point of the locus: the largest acceptable depth of a flaw of this length. */
export interface LocusPoint {
  readonly halfLengthMm: number;
  /** Null where even the shallowest flaw is outside the line. */
  readonly depthMm: number | null;
  readonly endedBy: LocusEnd;
}

/** Depth against length on the boundary of what is acceptable. */
export interface LimitingLocus {
  readonly status: 'found';
  /** By rising length; corners, where the reason changes, are points of their own. */
  readonly points: readonly LocusPoint[];
}

export interface LocusQuestion {
  /** Room to the line of the diagram at depth a and half length c, above 0 inside [mm, mm → -]. */
  readonly margin: (a: number, c: number) => number;
  /** Room to the upper limits of the solutions, above 0 inside [mm, mm → -]. */
  readonly validity: (a: number, c: number) => number;
  readonly thicknessMm: number;
  readonly shortestHalfLengthMm: number;
  readonly longestHalfLengthMm: number;
  /** Lengths that are looked at, evenly spaced in their logarithm. */
  readonly lengths?: number;
  /** Largest depth as a share of the wall; 0.8 is the end of most published solutions. */
  readonly deepestShare?: number;
}

/** The locus over a range of lengths, each depth the first that ends it counted from a shallow flaw. */
export function limitingLocus(question: LocusQuestion): LimitingLocus | Refused {
  const refusals = refusalsOf(question);
  if (refusals.length > 0) return refused(...refusals);
  const { shortestHalfLengthMm, longestHalfLengthMm, lengths = 25 } = question;
  const ratio = longestHalfLengthMm / shortestHalfLengthMm;
  const points: LocusPoint[] = [];
  for (let i = 0; i < lengths; i++) {
    const at = limitingDepth(question, shortestHalfLengthMm * ratio ** (i / (lengths - 1)));
    if (at === null) return refused(noNumber());
    const before = points[points.length - 1];
    if (before && before.endedBy !== at.endedBy) points.push(...corner(question, before, at));
    points.push(at);
  }
  return { status: 'found', points };
}

// shallow enough to stand for no flaw at all
const SHALLOWEST = 1e-4;

/** Largest acceptable depth at one half length; null where the functions are no number. */
export function limitingDepth(
  { margin, validity, thicknessMm, deepestShare = 0.8 }: LocusQuestion,
  c: number,
): LocusPoint | null {
  const deepest = deepestShare * thicknessMm;
  const lowest = SHALLOWEST * thicknessMm;
  const range = firstCrossing((a) => validity(a, c), lowest, deepest, { tolerance: 1e-10 });
  if (range.status === 'not a number') return null;
  const valid = range.status === 'none' ? deepest : range.x;
  const outOfRange: LocusEnd = range.status === 'none' ? 'depth share' : 'validity';
  if (range.status === 'below from the start') {
    return { halfLengthMm: c, depthMm: null, endedBy: 'validity' };
  }
  const line = firstCrossing((a) => margin(a, c), lowest, valid * (1 - 1e-12), {
    intervals: 40,
    tolerance: 1e-10,
  });
  switch (line.status) {
    case 'not a number':
      return null;
    case 'below from the start':
      return { halfLengthMm: c, depthMm: null, endedBy: 'none acceptable' };
    case 'found':
      return { halfLengthMm: c, depthMm: line.x, endedBy: 'line' };
    case 'none':
      return { halfLengthMm: c, depthMm: valid, endedBy: outOfRange };
  }
}

/** The two points on either side of the length at which the reason changes, as near as makes no difference. */
function corner(question: LocusQuestion, from: LocusPoint, to: LocusPoint): readonly LocusPoint[] {
  let [low, high] = [from, to];
  while (high.halfLengthMm - low.halfLengthMm > 1e-6 * high.halfLengthMm) {
    const middle = limitingDepth(question, (low.halfLengthMm + high.halfLengthMm) / 2);
    if (middle === null) break;
    if (middle.endedBy === from.endedBy) low = middle;
    else high = middle;
  }
  return [low, high].filter((point) => point !== from && point !== to);
}

function refusalsOf(question: LocusQuestion): readonly Refusal[] {
  const { thicknessMm, shortestHalfLengthMm, longestHalfLengthMm } = question;
  const { lengths = 25, deepestShare = 0.8 } = question;
  const length = 'Give it in millimetres.';
  return outOfBounds([
    rule('thicknessMm', 'Wall thickness', 'mm', thicknessMm, 0, 1000, length),
    rule(
      'shortestHalfLengthMm',
      'Shortest half length',
      'mm',
      shortestHalfLengthMm,
      0,
      1e5,
      length,
    ),
    rule(
      'longestHalfLengthMm',
      'Longest half length',
      'mm',
      longestHalfLengthMm,
      Number.isFinite(shortestHalfLengthMm) ? shortestHalfLengthMm : 0,
      1e5,
      'Give the longest after the shortest, in millimetres.',
    ),
    rule(
      'deepestShare',
      'Largest share of the wall',
      '',
      deepestShare,
      0,
      1,
      'Give it as a share.',
    ),
    { ...rule('lengths', 'Number of lengths', '', lengths, 2, 1000, 'Use 25.'), above: false },
  ]);
}

const rule = (
  input: string,
  name: string,
  unit: string,
  value: number,
  min: number,
  max: number,
  instead: string,
) => ({ input, name, unit, value, min, max, instead, above: true });

const noNumber = (): Refusal => ({
  input: 'margin',
  limit: 'a number at every depth and length',
  value: null,
  message: 'The margin is no number for some flaw of this range.',
  instead: 'Narrow the range of lengths to what the solutions hold for.',
});
