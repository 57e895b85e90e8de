import type { RemainingLife } from '../assessment/assessment-outcome';
import { earliest, isAfter, monthsAfter, yearsAfter, type CalendarDate } from './calendar-date';
import type { IntervalPolicy } from './interval-policy';

/** One rule's date; the earliest of all governs. */
export interface DateCandidate {
  readonly rule:
    | 'fraction of life'
    | 'fraction of time to change of category'
    | 'mechanism maximum'
    | 'code maximum'
    | 'temporary measure';
  readonly dueOn: CalendarDate;
  readonly explanation: string;
  readonly governs: boolean;
}

export interface ReinspectionProposal {
  readonly status: 'proposed';
  readonly dueOn: CalendarDate;
  /** A sentence that says where the date comes from. */
  readonly basis: string;
  readonly candidates: readonly DateCandidate[];
  /** Day on which the flaw is predicted to reach its limit, rounded down; null when it does not within the horizon. */
  readonly limitOn: CalendarDate | null;
}

/** No date: the flaw may not go back into service as it is. */
export interface NoReinspection {
  readonly status: 'no date';
  readonly reason: string;
}

export interface ReinspectionSubject {
  readonly inspectedOn: CalendarDate;
  readonly life: RemainingLife;
  /** Damage mechanism, one of the site's list. */
  readonly mechanism: string;
  readonly policy: IntervalPolicy;
  /** Last day of a temporary measure the acceptance hangs on. */
  readonly temporaryUntil?: CalendarDate | null;
}

/**
 * Proposes the re-inspection date: every rule gives a candidate counted from the inspection date, the
 * earliest governs, and none is later than the predicted limit. Without a remaining life there is no date.
 */
export function proposeReinspection(
  subject: ReinspectionSubject,
): ReinspectionProposal | NoReinspection {
  const { life, inspectedOn } = subject;
  if (life.years === null || life.end === 'already at limit') {
    return {
      status: 'no date',
      reason: 'The flaw is not acceptable: no re-inspection date exists, repair before service.',
    };
  }
  const found = candidatesOf(subject, life.years);
  const dueOn = earliest(found.map((candidate) => candidate.dueOn)) ?? inspectedOn;
  const candidates = found.map((candidate) => ({
    ...candidate,
    governs: candidate.dueOn === dueOn,
  }));
  const governing = candidates.find(({ governs }) => governs);
  return {
    status: 'proposed',
    dueOn,
    basis: `${governing?.explanation ?? 'Inspection date'}: ${dueOn}.`,
    candidates,
    limitOn: endsInLife(life) ? yearsAfter(inspectedOn, life.years) : null,
  };
}

/** Whether growth was seen to end within the horizon, so that a limit date exists. */
const endsInLife = ({ end }: RemainingLife) => end !== 'horizon' && end !== 'no growth';

type Unranked = Omit<DateCandidate, 'governs'>;

function candidatesOf(subject: ReinspectionSubject, years: number): Unranked[] {
  const { inspectedOn, life, policy, temporaryUntil } = subject;
  const { lifeFraction, codeMaximumMonths } = policy;
  const fraction = shareText(lifeFraction);
  const candidates: Unranked[] = [
    {
      rule: 'fraction of life',
      dueOn: yearsAfter(inspectedOn, lifeFraction * years),
      explanation: `${fraction} of the remaining life of ${endsInLife(life) ? '' : 'at least '}${years} years from the inspection on ${inspectedOn}`,
    },
    mechanismCandidate(subject),
    {
      rule: 'code maximum',
      dueOn: monthsAfter(inspectedOn, codeMaximumMonths),
      explanation: `Longest interval of the site's rules, ${codeMaximumMonths} months from ${inspectedOn}`,
    },
  ];
  if (life.firstEventYears !== null) {
    candidates.push({
      rule: 'fraction of time to change of category',
      dueOn: yearsAfter(inspectedOn, lifeFraction * life.firstEventYears),
      explanation: `${fraction} of the ${life.firstEventYears} years until the flaw is predicted to change category, from ${inspectedOn}`,
    });
  }
  if (temporaryUntil) {
    candidates.push({
      rule: 'temporary measure',
      dueOn: temporaryUntil,
      explanation: `The temporary measure ends on ${temporaryUntil}`,
    });
  }
  return candidates;
}

function mechanismCandidate({ inspectedOn, mechanism, policy }: ReinspectionSubject): Unranked {
  const own = policy.maximumMonthsByMechanism[mechanism];
  // a mechanism the site has no rule for is as uncertain as an unknown one
  const months = own ?? policy.maximumMonthsByMechanism['unknown'] ?? policy.codeMaximumMonths;
  return {
    rule: 'mechanism maximum',
    dueOn: monthsAfter(inspectedOn, months),
    explanation: `Site maximum of ${months} months for ${own === undefined ? 'an unknown mechanism' : mechanism}, from ${inspectedOn}`,
  };
}

const shareText = (fraction: number) =>
  fraction === 0.5 ? 'Half' : `${Math.round(fraction * 100)} %`;

/** Whether a date lies beyond the day the flaw is predicted to reach its limit. */
export const isBeyondLimit = (day: CalendarDate, limitOn: CalendarDate | null): boolean =>
  limitOn !== null && isAfter(day, limitOn);
