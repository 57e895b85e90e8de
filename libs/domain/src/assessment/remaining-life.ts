import type { GrowthHistory } from './follow-growth';
import type { RemainingLife } from './assessment-outcome';

// rounded down so that no figure promises more than was computed
// (a rounding of the machine is not a reason to lose a hundredth)
const down = (years: number) => Math.floor(years * 100 + 1e-6) / 100;

/** Longest life ever stated as a figure [years]; common practice. */
const LONGEST_STATED = 40;

/** The life of a flaw that is not acceptable now: there is none. */
export const NO_LIFE: RemainingLife = {
  years: null,
  cycles: null,
  end: 'already at limit',
  because: 'The flaw is not acceptable at its assessed size: there is no remaining life.',
  firstEventYears: null,
};

/** States the remaining life of an acceptable flaw, rounded down, with the reason it ends. */
export function remainingLife(history: GrowthHistory, cyclesPerYear: number): RemainingLife {
  const years = down(history.years);
  const event = history.events.find((each) => each.years < history.years);
  return {
    years,
    cycles: Math.floor(history.years * cyclesPerYear),
    end: history.end,
    because: because(history, years),
    firstEventYears: event ? down(event.years) : null,
  };
}

function because({ end, validityLimit }: GrowthHistory, years: number): string {
  const after = years > LONGEST_STATED ? `more than ${LONGEST_STATED} years` : `${years} years`;
  switch (end) {
    case 'limit reached':
      return `The growing flaw reaches the line of the failure assessment diagram after ${after}.`;
    case 'through-wall':
      return `The growing flaw counts as through the wall after ${after} (${validityLimit ?? 'a/t'}): from then on it is a leak.`;
    case 'outside validity':
      return `After ${after} the growing flaw leaves the range of the solution (${validityLimit ?? 'limit not named'}); it is not followed further.`;
    case 'horizon':
      return `The flaw stays acceptable for the whole time it was followed, ${after}; growth beyond was not looked at.`;
    case 'no growth':
      return 'No part of the flaw grows under the given cycles and rates.';
    default:
      return 'Growth is not followed further.';
  }
}
