import type { PlacedFlaw } from '../geometry/characterisation/interaction-rules';
import { combined, interacts } from '../geometry/characterisation/interacts';
import { growNeighbours } from '../growth/grow-neighbours';
import { integrateGrowth } from '../growth/integrate-growth';
import type { CharacterisedFlaw } from './characterise';
import type { Neighbourhood } from './combine-neighbours';
import type { GrowthDrivers } from './drivers';
import type { FlawCase } from './flaw-case';
import { growthRates } from './growth-rates-of';
import { sectionOf, type Section } from './section';

/** The first time a growing flaw meets one beside it. */
export interface Meeting {
  /** Years from the present state. */
  readonly years: number;
  readonly with: string;
}

/** What surrounds the growing flaw and how the growth is driven. */
export interface Surroundings {
  readonly flaw: FlawCase;
  readonly neighbourhood: Neighbourhood;
  readonly drivers: GrowthDrivers;
  readonly elapsed: number;
}

/** A neighbour as a flaw of its own in the same wall under the same stress. */
const sectionOfNeighbour = (
  { flaw, drivers }: Surroundings,
  { kind, a, c, ligamentMm }: PlacedFlaw,
): Section =>
  sectionOf(
    flaw,
    { kind, face: flaw.situation.face, a, c, ligament: ligamentMm },
    drivers.thinning,
  );

/** The earliest meeting with a neighbour in the same plane and category, each grown by its own K; null when none. */
export function firstMeeting(
  around: Surroundings,
  current: Pick<CharacterisedFlaw, 'kind' | 'a' | 'c'>,
  section: Section,
  horizonYears: number,
): Meeting | null {
  const { neighbourhood, drivers, elapsed } = around;
  const { flaw: own, others, rule } = neighbourhood;
  const rates = growthRates(section, drivers, elapsed);
  const meetings = others.flatMap((other): Meeting[] => {
    if (other.kind !== current.kind || horizonYears <= 0) return [];
    if (interacts(own, other, rule).planesMm > rule.planeLimit(own, other)) return [];
    const beside = growthRates(sectionOfNeighbour(around, other), drivers, elapsed);
    const grown = growNeighbours(
      {
        flaws: [{ a: current.a, c: current.c }, other],
        rates: [(a, c, into) => rates(a, c, into, 0), (a, c, into) => beside(a, c, into, 0)],
        centreDistanceMm: Math.abs(other.positionMm - own.positionMm),
        rule: (one, two) => rule.alongLimit({ ...own, ...one }, { ...other, ...two }),
      },
      horizonYears,
    );
    return grown.status === 'joined' ? [{ years: grown.years, with: other.name }] : [];
  });
  return meetings.sort((x, y) => x.years - y.years)[0] ?? null;
}

/** The neighbourhood after a meeting: the flaw that encloses both, the others grown to that day. */
export function joinNeighbour(
  around: Surroundings,
  grown: Pick<PlacedFlaw, 'a' | 'c' | 'ligamentMm'>,
  meeting: Meeting,
): Neighbourhood {
  const { neighbourhood } = around;
  const later = neighbourhood.others.map((other) => grownFor(around, other, meeting.years));
  const met = later.find(({ name }) => name === meeting.with);
  const own: PlacedFlaw = { ...neighbourhood.flaw, ...grown };
  return {
    ...neighbourhood,
    flaw: met ? combined(own, met) : own,
    others: later.filter((each) => each !== met),
  };
}

/** A neighbour grown on its own for some years. */
function grownFor(around: Surroundings, other: PlacedFlaw, years: number): PlacedFlaw {
  const section = sectionOfNeighbour(around, other);
  const run = integrateGrowth(
    other,
    growthRates(section, around.drivers, around.elapsed),
    [{ key: 'validity', margin: (a, c) => section.validity(a, c).room }],
    { horizonYears: Math.max(years, 1e-9) },
  );
  const last = run.states[run.states.length - 1];
  return last ? { ...other, a: last.a, c: last.c } : other;
}
