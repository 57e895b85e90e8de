import { RATIO_AT_WELDS, ratesPerYear } from '../growth/growth-rates';
import type { RatesAt } from '../growth/growth-walk';
import { stabilityMargin } from '../growth/laws/forman';
import { netDepthRate } from '../growth/with-time/thinning';
import type { GrowthDrivers } from './drivers';
import type { Section } from './section';

/** Rates of a flaw in its section: cycles and time added up, the wall as it is at that time. */
export function growthRates(section: Section, drivers: GrowthDrivers, elapsed: number): RatesAt {
  const { evaluator, crackAt, rise } = section;
  const { withTime, thinning } = drivers;
  let factor = 1;
  const perYear = ratesPerYear(drivers, {
    deepest: (membrane, bending) => factor * evaluator.deepest(membrane, bending),
    end: (membrane, bending) => factor * evaluator.end(membrane, bending),
  });
  const { front } = evaluator.solutions.stressIntensity;
  return (a, c, into, years) => {
    const crack = crackAt(a, c, elapsed + years);
    factor = rise(elapsed + years);
    // what stays on needs the reference stress of the whole crack, cycles need the two points only
    if (withTime) evaluator.take(crack);
    else evaluator.takeEnds(crack);
    perYear(into);
    if (withTime) {
      const k = evaluator.sustained(factor);
      into.a += withTime.rate(k.deepest);
      into.c += withTime.rate(k.end);
    }
    if (thinning) into.a = Math.max(netDepthRate(into.a, thinning), 0);
    // a straight front has no ends of its own, a through-wall crack no deepest point
    if (front === 'straight') into.c = 0;
    if (front === 'through') into.a = 0;
  };
}

/**
 * Room to the largest range or stress intensity the growth laws were published for; null when they name none.
 * Growth is not followed by a law beyond its range.
 */
export function lawMargin(
  section: Section,
  { fatigue, withTime }: GrowthDrivers,
  elapsed: number,
): ((a: number, c: number, years: number) => number) | null {
  const { evaluator, crackAt, rise } = section;
  const law = fatigue?.law;
  const blocks = fatigue?.blocks ?? [];
  const most = law && 'form' in law ? law.scope.rangeMPaSqrtMm[1] : Infinity;
  const fracture = law && 'form' in law && law.form === 'forman' ? law.toughnessMPaSqrtMm : null;
  const longest = withTime ? withTime.law.stressIntensityMPaSqrtMm[1] : Infinity;
  if (!Number.isFinite(most) && !Number.isFinite(longest)) return null;
  return (a, c, years) => {
    const factor = rise(elapsed + years);
    evaluator.take(crackAt(a, c, elapsed + years));
    let room = 1;
    for (const { membraneRangeMPa, bendingRangeMPa, stressRatio = RATIO_AT_WELDS } of blocks) {
      const range = Math.max(
        evaluator.deepest(membraneRangeMPa, bendingRangeMPa),
        evaluator.end(membraneRangeMPa, bendingRangeMPa),
      );
      if (Number.isFinite(most)) room = Math.min(room, 1 - (factor * range) / most);
      if (fracture !== null) {
        room = Math.min(room, stabilityMargin(factor * range, stressRatio, fracture) / fracture);
      }
    }
    if (Number.isFinite(longest)) {
      const k = evaluator.sustained(factor);
      room = Math.min(room, 1 - Math.max(k.deepest, k.end) / longest);
    }
    return room;
  };
}
