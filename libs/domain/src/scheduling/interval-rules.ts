import { outOfBounds, refused, type NumberRule } from '../geometry/refusal';
import { intervalOf, type IntervalOutcome } from './interval-outcome';

const API_510 = 'API 510, 6.5.1 (from memory)';
const API_510_EXTERNAL = 'API 510, 6.4 (from memory)';
const API_570 = 'API 570, Table 2, as quoted by a county regulator (half life and table)';
const HALF_GROWTH =
  'Eurocode 9, 2.3.2: interval of at most half the time from detectable to critical, detectable at POD above 90 %';
const FACTOR = 'common practice: factor 2 to 10 on life by access and consequence';

const LONGEST_YEARS = 10;
const SHORT_LIFE_YEARS = 4;
const SHORT_LIFE_LONGEST_YEARS = 2;
const EXTERNAL_YEARS = 5;

/**
 * Longest internal or on-stream interval of a vessel: half the life, at most ten years; a life below four
 * years is used whole, at most two.
 */
export function vesselInternalInterval(remainingLifeYears: number): IntervalOutcome {
  const refusals = outOfBounds([lifeRule(remainingLifeYears)]);
  if (refusals.length > 0) return refused(...refusals);
  if (remainingLifeYears < SHORT_LIFE_YEARS) {
    return intervalOf(
      Math.min(remainingLifeYears, SHORT_LIFE_LONGEST_YEARS),
      `the remaining life of ${years(remainingLifeYears)}, at most ${SHORT_LIFE_LONGEST_YEARS} years`,
      API_510,
    );
  }
  return intervalOf(
    Math.min(remainingLifeYears / 2, LONGEST_YEARS),
    `half the remaining life of ${years(remainingLifeYears)}, at most ${LONGEST_YEARS} years`,
    API_510,
  );
}

/** Longest external interval of a vessel: five years, or the internal interval when that is shorter. */
export function vesselExternalInterval(remainingLifeYears: number): IntervalOutcome {
  const internal = vesselInternalInterval(remainingLifeYears);
  return internal.status === 'interval' && internal.years > EXTERNAL_YEARS
    ? intervalOf(EXTERNAL_YEARS, `at most ${EXTERNAL_YEARS} years`, API_510_EXTERNAL)
    : internal;
}

/** Piping by the consequence of a failure; class 1 is the worst, class 4 carries what does no harm. */
export const PIPING_CLASSES = [1, 2, 3, 4] as const;
export type PipingClass = (typeof PIPING_CLASSES)[number];

const THICKNESS_YEARS = { 1: 5, 2: 10, 3: 10, 4: null } as const;
const VISUAL_YEARS = { 1: 5, 2: 5, 3: 10, 4: null } as const;

/** Longest interval between thickness measurements of piping: half the life, at most that of its class. */
export function pipingThicknessInterval(
  pipingClass: PipingClass,
  remainingLifeYears: number,
): IntervalOutcome {
  const refusals = outOfBounds([lifeRule(remainingLifeYears)]);
  if (refusals.length > 0) return refused(...refusals);
  const most = THICKNESS_YEARS[pipingClass];
  if (most === null) return optional();
  return intervalOf(
    Math.min(remainingLifeYears / 2, most),
    `half the remaining life of ${years(remainingLifeYears)}, at most ${most} years for class ${pipingClass}`,
    API_570,
  );
}

/** Longest interval between external visual inspections of piping. */
export function pipingVisualInterval(pipingClass: PipingClass): IntervalOutcome {
  const most = VISUAL_YEARS[pipingClass];
  return most === null
    ? optional()
    : intervalOf(most, `at most ${most} years for class ${pipingClass}`, API_570);
}

/**
 * Interval from crack growth: at most half the time from detectable to critical, so that two inspections
 * fall inside.
 */
export function growthWindowInterval(detectableToCriticalYears: number): IntervalOutcome {
  const refusals = outOfBounds([
    {
      ...lifeRule(detectableToCriticalYears),
      input: 'detectableToCriticalYears',
      name: 'Time from detectable to critical',
    },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  return intervalOf(
    detectableToCriticalYears / 2,
    `half the time from detectable to critical of ${years(detectableToCriticalYears)}`,
    HALF_GROWTH,
  );
}

/**
 * Interval as the remaining life over a factor, 2 for what is redundant and easily seen, up to 10 for the
 * opposite.
 */
export function factoredLifeInterval(remainingLifeYears: number, factor: number): IntervalOutcome {
  const refusals = outOfBounds([
    lifeRule(remainingLifeYears),
    {
      input: 'factorOnLife',
      name: 'Factor on life',
      unit: '',
      value: factor,
      min: 1,
      max: 100,
      instead: 'Give a factor of 2 to 10; half the life is a factor of 2.',
    },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  return intervalOf(
    remainingLifeYears / factor,
    `the remaining life of ${years(remainingLifeYears)} over a factor of ${factor}`,
    FACTOR,
  );
}

const optional = (): IntervalOutcome => ({
  status: 'not required',
  because: 'For class 4 the owner decides whether and when to inspect.',
  source: API_570,
});

// a life below 0 is overdue, not a mistake
const lifeRule = (value: number): NumberRule => ({
  input: 'remainingLifeYears',
  name: 'Remaining life',
  unit: 'years',
  value,
  min: -200,
  max: 1000,
  instead: 'Give it in years; a life in months or cycles is the usual mistake.',
});

const years = (value: number) => `${Number(value.toPrecision(6))} years`;
