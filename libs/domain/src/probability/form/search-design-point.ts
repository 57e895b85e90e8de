import { findRoot } from '../../numerics/find-root';
import { dot, length, scaled, sum, type StandardSpace } from './standard-space';

/** Where the search for the point of failure nearest to the mean ended. */
export interface DesignPointSearch {
  readonly status: 'converged' | 'iteration limit' | 'no failure found' | 'not a number';
  readonly point: Float64Array;
  /** Unit vector from safe to failed at the point. */
  readonly direction: Float64Array;
  readonly iterations: number;
}

const MOST_ITERATIONS = 100;
/** Where a probability underflows. */
const REACH = 37;
/** Where the slope does not lead, no failure is looked for beyond this distance: its probability is below 1e-32. */
const FARTHEST = 12;
const CLOSE = 1e-7;
const HALVINGS = 12;

/**
 * Design point by the iteration of Hasofer, Lind, Rackwitz and Fiessler with a step length that lowers the
 * merit ½u² + c |g| (Zhang and Der Kiureghian 1995); where that stalls, by turning the direction step by
 * step with the crossing on it found inside a bracket.
 */
export function searchDesignPoint(space: StandardSpace): DesignPointSearch {
  const quick = rackwitzFiessler(space);
  return quick.status === 'converged' || quick.status === 'not a number'
    ? quick
    : turning(space, quick.direction);
}

function rackwitzFiessler(space: StandardSpace): DesignPointSearch {
  let u: Float64Array = new Float64Array(space.dimensions);
  let g = space.margin(u);
  let direction: Float64Array = new Float64Array(space.dimensions);
  const scale = Math.abs(g) || 1;
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    const slope = space.gradient(u);
    const steep = length(slope);
    if (!Number.isFinite(g) || !Number.isFinite(steep)) {
      return { status: 'not a number', point: u, direction, iterations: iteration };
    }
    if (steep === 0) {
      return { status: 'no failure found', point: u, direction, iterations: iteration };
    }
    direction = scaled(slope, -1 / steep);
    const distance = dot(direction, u) + g / steep;
    // a flat margin would send the search to where no distribution has values any more
    const target = scaled(direction, Math.min(Math.max(distance, -REACH), REACH));
    const step = sum(target, u, -1);
    if (length(step) < CLOSE && Math.abs(g) < 1e-9 * scale) {
      return { status: 'converged', point: u, direction, iterations: iteration };
    }
    const penalty = 2 * Math.max(length(u) / steep, length(target) / steep) + 1e-3 / steep;
    const merit = (at: Float64Array, value: number) => dot(at, at) / 2 + penalty * Math.abs(value);
    const now = merit(u, g);
    let share = 1;
    for (let halving = 0; halving <= HALVINGS; halving++, share /= 2) {
      const trial = sum(u, step, share);
      const value = space.margin(trial);
      if (halving === HALVINGS || merit(trial, value) < now || share * length(step) < CLOSE) {
        [u, g] = [trial, value];
        break;
      }
    }
  }
  return { status: 'iteration limit', point: u, direction, iterations: MOST_ITERATIONS };
}

/** The direction turned by a share towards the one the slope asks for; the share is halved when β grows. */
function turning(space: StandardSpace, start: Float64Array): DesignPointSearch {
  let direction = length(start) > 0 ? start : firstDirection(space);
  let best = crossingOn(space, direction);
  let share = 1;
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    if (best === null) break;
    const point = scaled(direction, best);
    const slope = space.gradient(point);
    const steep = length(slope);
    if (!Number.isFinite(steep)) {
      return { status: 'not a number', point, direction, iterations: iteration };
    }
    if (steep === 0) break;
    const wanted = scaled(slope, -1 / steep);
    if (length(sum(wanted, direction, -1)) < 1e-6) {
      return { status: 'converged', point, direction: wanted, iterations: iteration };
    }
    const mixed = sum(scaled(direction, 1 - share), wanted, share);
    const turned = scaled(mixed, 1 / (length(mixed) || 1));
    const next = crossingOn(space, turned);
    if (next !== null && Math.abs(next) <= Math.abs(best) + 1e-9)
      [direction, best] = [turned, next];
    else share /= 2;
    if (share < 1e-6) return { status: 'iteration limit', point, direction, iterations: iteration };
  }
  const status = best === null ? 'no failure found' : 'iteration limit';
  return { status, point: scaled(direction, best ?? 0), direction, iterations: MOST_ITERATIONS };
}

/** Distance to the limit along a direction, negative behind the mean; null when none within reach. */
function crossingOn(space: StandardSpace, direction: Float64Array): number | null {
  const margin = (distance: number) => space.margin(scaled(direction, distance));
  const failed = margin(0) <= 0;
  const end = failed ? -FARTHEST : FARTHEST;
  let before = 0;
  for (let i = 1; i <= 24; i++) {
    const at = (end * i) / 24;
    if (margin(at) <= 0 !== failed) {
      const root = findRoot(margin, before, at, { tolerance: 1e-10 });
      return root.status === 'found' ? root.x : null;
    }
    before = at;
  }
  return null;
}

/** The axis along which the margin falls most over three standard deviations. */
function firstDirection(space: StandardSpace): Float64Array {
  let best = new Float64Array(space.dimensions);
  let least = Infinity;
  for (let k = 0; k < space.dimensions; k++) {
    for (const sign of [1, -1]) {
      const axis = new Float64Array(space.dimensions);
      axis[k] = sign;
      const value = space.margin(scaled(axis, 3));
      if (value < least) [best, least] = [axis, value];
    }
  }
  return best;
}
