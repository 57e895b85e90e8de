import type { RatesAt } from './growth-walk';
import {
  integrateGrowth,
  type GrowthLimit,
  type GrowthOptions,
  type SizeAt,
} from './integrate-growth';

/** The time in which an inspection can find a growing flaw before it becomes critical. */
export type DetectableWindow =
  | {
      readonly status: 'window';
      /** Years until the flaw can be found; 0 when it can be found already. */
      readonly yearsToDetectable: number;
      /** Years from there to critical; the rule of half of it sets the interval. */
      readonly yearsToCritical: number;
      readonly detectable: SizeAt;
      readonly critical: SizeAt;
      /** Key of the limit reached. */
      readonly limit: string;
    }
  /** No inspection of this technique would find it in time. */
  | {
      readonly status: 'critical before detectable';
      readonly years: number;
      readonly limit: string;
    }
  /** It can be found, and does not become critical within the horizon. */
  | { readonly status: 'not critical within the horizon'; readonly yearsToDetectable: number }
  | { readonly status: 'not detectable within the horizon' }
  | { readonly status: 'not followed'; readonly because: string };

export interface WindowQuestion {
  readonly start: { readonly a: number; readonly c: number };
  readonly rates: RatesAt;
  /** Room to the size that can be found, above 0 while it cannot, e.g. a90 − a. */
  readonly untilDetectable: (a: number, c: number) => number;
  readonly critical: readonly GrowthLimit[];
}

const DETECTABLE = 'detectable';

/** Follows growth first to the size that can be found, then on to the critical one. */
export function detectableToCritical(
  { start, rates, untilDetectable, critical }: WindowQuestion,
  options: GrowthOptions,
): DetectableWindow {
  const spent = critical.find(({ margin }) => !(margin(start.a, start.c, 0) > 0));
  if (spent) return { status: 'critical before detectable', years: 0, limit: spent.key };
  const already = !(untilDetectable(start.a, start.c) > 0);
  let found: SizeAt = { ...start, years: 0 };
  if (!already) {
    const first = integrateGrowth(
      start,
      rates,
      [{ key: DETECTABLE, margin: untilDetectable }, ...critical],
      options,
    );
    const end = first.states[first.states.length - 1] ?? found;
    if (first.stop === 'step limit') return NOT_FOLLOWED;
    if (first.limit === null) return { status: 'not detectable within the horizon' };
    if (first.limit !== DETECTABLE) {
      return { status: 'critical before detectable', years: end.years, limit: first.limit };
    }
    found = end;
  }
  const second = integrateGrowth(
    found,
    (a, c, into, years) => rates(a, c, into, found.years + years),
    critical.map(({ key, margin }) => ({
      key,
      margin: (a, c, years) => margin(a, c, found.years + years),
    })),
    { ...options, horizonYears: options.horizonYears - found.years },
  );
  const last = second.states[second.states.length - 1];
  if (second.stop === 'step limit' || !last) return NOT_FOLLOWED;
  if (second.limit === null) {
    return { status: 'not critical within the horizon', yearsToDetectable: found.years };
  }
  return {
    status: 'window',
    yearsToDetectable: found.years,
    yearsToCritical: last.years,
    detectable: found,
    critical: { ...last, years: found.years + last.years },
    limit: second.limit,
  };
}

const NOT_FOLLOWED: DetectableWindow = {
  status: 'not followed',
  because: 'Growth could not be followed to its end.',
};
