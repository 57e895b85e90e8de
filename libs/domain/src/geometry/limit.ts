import type { Crack } from './crack';

/** A limit of a published solution, as data: what is measured, between which bounds, on whose word. */
export interface Limit {
  readonly name: string;
  /** The limit in words and figures, as the engineer reads it. */
  readonly text: string;
  readonly min: number;
  readonly max: number;
  readonly measure: (crack: Crack) => number;
  readonly source: string;
  /** Path of the input that decides it, e.g. `flaw.heightMm`. */
  readonly input: string;
  /** What to do when it is broken. */
  readonly instead: string;
}

/** A limit applied to one case. */
export interface LimitCheck {
  readonly name: string;
  readonly limit: string;
  readonly value: number;
  readonly met: boolean;
  /** Met, but within 10 % of a bound. */
  readonly near: boolean;
  readonly source: string;
}

/** Name of every limit on depth against wall: a flaw at its end counts as through the wall. */
export const DEPTH_RATIO = 'a/t';

// a size that was driven to a bound by a root search may stand a rounding beyond it
const ROUNDING = 1e-9;

/** Applies one limit to a crack. A value that is not a number meets no limit. */
export function checkLimit(limit: Limit, crack: Crack): LimitCheck {
  const value = limit.measure(crack);
  const met =
    value >= limit.min - ROUNDING * Math.abs(limit.min) &&
    value <= limit.max + ROUNDING * Math.abs(limit.max);
  const nearMax = Number.isFinite(limit.max) && value > 0.9 * limit.max;
  const nearMin = limit.min > 0 && value < 1.1 * limit.min;
  return {
    name: limit.name,
    limit: limit.text,
    value,
    met,
    near: met && (nearMax || nearMin),
    source: limit.source,
  };
}

/** Whether a crack is inside every limit. */
export const insideLimits = (limits: readonly Limit[], crack: Crack): boolean =>
  limits.every((limit) => checkLimit(limit, crack).met);

/** Room left to the upper bounds, and which bound is nearest to being reached. */
export interface Room {
  readonly room: number;
  readonly limit: Limit | null;
}

/** The smallest room to any upper bound, as a share of the bound; below 0 once one is passed. */
export function roomToUpperBounds(limits: readonly Limit[], crack: Crack): Room {
  let nearest: Room = { room: Infinity, limit: null };
  for (const limit of limits) {
    if (!Number.isFinite(limit.max)) continue;
    const room = (limit.max - limit.measure(crack)) / limit.max;
    if (room < nearest.room) nearest = { room, limit };
  }
  return nearest;
}
