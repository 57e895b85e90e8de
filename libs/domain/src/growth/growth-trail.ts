import type { Stepper } from '../numerics/dormand-prince';
import { sizeIn, type GrowthStateVector } from './growth-walk';
import type { SizeAt } from './integrate-growth';

/** What is kept of the way: its states and its length. */
export interface GrowthTrail {
  /** Notes a share of the step just taken from y. */
  readonly take: (stepper: Stepper, y: GrowthStateVector, h: number, share: number) => void;
  /** Notes that the flaw stands as it is to the horizon. */
  readonly rest: (horizonYears: number) => void;
  readonly end: () => { readonly states: readonly SizeAt[]; readonly distance: number };
}

/** Places of a step whose states are kept when even ones are wanted. */
const KEPT = 16;

/** A trail from a start: of the states at the steps, or of a number of states even along the way. */
export function growthTrail(
  { a, c }: { readonly a: number; readonly c: number },
  wanted: number | undefined,
): GrowthTrail {
  const states: SizeAt[] = [{ years: 0, a, c }];
  const places: number[] = [0];
  const state = Float64Array.of(0, Math.log(a), Math.log(c));
  let distance = 0;
  const keep = (place: number) => {
    states.push(sizeIn(state));
    places.push(place);
  };
  return {
    take: (stepper, y, h, share) => {
      const parts = wanted === undefined ? 1 : KEPT;
      for (let part = 1; part <= parts; part++) {
        const at = (share * part) / parts;
        stepper.between(y, h, at, state);
        keep(distance + h * at);
      }
      distance += h * share;
    },
    rest: (horizonYears) => {
      states.push({ ...sizeIn(state), years: horizonYears });
      places.push(distance);
    },
    end: () => ({
      states: wanted === undefined ? states : evenly(states, places, wanted),
      distance,
    }),
  };
}

/** Of many states those nearest to even places; the first and the last stay. */
function evenly(states: readonly SizeAt[], places: readonly number[], wanted: number) {
  const whole = places[places.length - 1] ?? 0;
  const chosen: SizeAt[] = [];
  let next = 0;
  states.forEach((state, i) => {
    const last = i === states.length - 1;
    if (!last && (places[i] ?? 0) < (next * whole) / (wanted - 1)) return;
    chosen.push(state);
    while ((next * whole) / (wanted - 1) <= (places[i] ?? 0) && next < wanted) next++;
  });
  return chosen;
}
