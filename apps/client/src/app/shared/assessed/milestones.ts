import type { GrowthEnd, GrowthState } from '@ligament/domain/assessment/assessment-outcome';
import { daysBetween, yearsAfter } from '@ligament/domain/scheduling/calendar-date';
import type { AssessedCase } from './assessed-case';
import { stateAt } from './state-at';

const DAYS_PER_YEAR = 365.25;

/** A state of the growing flaw on a day. */
export interface Milestone {
  readonly on: string;
  readonly state: GrowthState;
}

/** The flaw as predicted for the day of the next inspection; null without a date, or beyond what was followed. */
export function atNextInspection({ outcome, inspectedOn, dueOn }: AssessedCase): Milestone | null {
  if (dueOn === null) return null;
  const state = stateAt(outcome.path, daysBetween(inspectedOn, dueOn) / DAYS_PER_YEAR);
  return state ? { on: dueOn, state } : null;
}

const ENDS: readonly GrowthEnd[] = ['limit reached', 'through-wall', 'outside validity'];

/** Where growth ends within the years it was followed; null when it does not. */
export function atLimit({ outcome, inspectedOn }: AssessedCase): Milestone | null {
  const state = outcome.path.at(-1);
  const { years, end } = outcome.life;
  if (!state || years === null || !ENDS.includes(end)) return null;
  return { on: yearsAfter(inspectedOn, years), state };
}

/** What the end of growth is called in a drawing. */
export const limitWord = (end: GrowthEnd): string =>
  end === 'outside validity' ? 'end of the method’s range' : 'limiting';
