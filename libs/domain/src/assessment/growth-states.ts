import type { GrowthRun, SizeAt } from '../growth/integrate-growth';
import type { GrowthDrivers } from './drivers';
import { toMPaSqrtM } from '../units/convert';
import type { GrowthState } from './assessment-outcome';
import type { Section } from './section';

/** One stretch of the way in one category. */
export interface Stretch {
  readonly section: Section;
  readonly run: GrowthRun;
  /** Years gone before it. */
  readonly from: number;
}

const MOST_STATES = 60;

/** The states of all stretches, thinned evenly to what a drawing can use; first and last always stay. */
export function growthStates(stretches: readonly Stretch[], drivers: GrowthDrivers): GrowthState[] {
  const perYear = cyclesPerYear(drivers);
  const total = stretches.reduce((sum, { run }) => sum + run.states.length, 0);
  const every = Math.max(Math.ceil(total / MOST_STATES), 1);
  return stretches.flatMap(({ section, run, from }) =>
    run.states
      .filter((_, i, all) => i % every === 0 || i === all.length - 1)
      .map((size) => stateOf(section, size, from, perYear)),
  );
}

/** Cycles of every block in a year. */
export const cyclesPerYear = ({ fatigue }: Pick<GrowthDrivers, 'fatigue'>): number =>
  (fatigue?.blocks ?? []).reduce((sum, block) => sum + block.cyclesPerYear, 0);

/** One state of the growing flaw: its size evaluated at service load. */
export function stateOf(
  section: Section,
  size: SizeAt,
  from: number,
  perYear: number,
): GrowthState {
  const { evaluator, kind } = section;
  const years = from + size.years;
  const rise = section.rise(years);
  evaluator.take(section.crackAt(size.a, size.c, years));
  const { lr, kr, governing } = evaluator.point(rise);
  const { kPrimary, kSecondary } = evaluator.frontAt(governing, rise);
  return {
    years,
    cycles: years * perYear,
    kind,
    ...section.shown(size.a, size.c),
    ligamentMm: section.ligament(size.a, years),
    kMaxMPaSqrtM: toMPaSqrtM(kPrimary + kSecondary),
    kr,
    lr,
  };
}
