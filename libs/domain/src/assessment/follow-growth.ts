import { growWithTime } from '../growth/grow-with-time';
import {
  integrateGrowth,
  type GrowthLimit,
  type GrowthRun,
  type SizeAt,
} from '../growth/integrate-growth';
import {
  PROXIMITY_RULE,
  proximityMargin,
  surfaceDepth,
  THROUGH_WALL_RULE,
  throughWallHalfLength,
} from '../growth/recategorise';
import { DEPTH_RATIO } from '../geometry/limit';
import type { FlawKind } from '../geometry/flaw-kind';
import type { GrowthDrivers } from './drivers';
import { growthRates, lawMargin } from './growth-rates-of';
import type { GrowthEnd, GrowthEvent, GrowthState } from './assessment-outcome';
import type { CharacterisedFlaw } from './characterise';
import type { Neighbourhood } from './combine-neighbours';
import { firstMeeting, joinNeighbour, type Meeting } from './join-neighbours';
import type { FlawCase } from './flaw-case';
import { growthStates, type Stretch } from './growth-states';
import { sectionOf, type Section } from './section';

/** The whole way of the flaw: what it passed, where it ended and why. */
export interface GrowthHistory {
  readonly path: readonly GrowthState[];
  readonly events: readonly GrowthEvent[];
  readonly years: number;
  readonly end: GrowthEnd;
  /** Limit of a solution that ended it, in words. */
  readonly validityLimit: string | null;
}

/** Limits that end a stretch of the way and not the way itself. */
const PROXIMITY = 'proximity';
const NEIGHBOUR = 'neighbour';

/** States wanted on the path for drawing. */
const DRAWN_STATES = 40;

/** Follows the flaw from its assessed size, through changes of category, to the end. */
export function followGrowth(
  flaw: FlawCase,
  start: CharacterisedFlaw,
  drivers: GrowthDrivers,
  horizonYears: number,
): GrowthHistory {
  const stretches: Stretch[] = [];
  const events: GrowthEvent[] = [];
  let current = start;
  let elapsed = 0;
  for (;;) {
    const section = sectionOf(flaw, current, drivers.thinning);
    const { neighbourhood } = current;
    const around = neighbourhood && { flaw, neighbourhood, drivers, elapsed };
    const meeting = around ? firstMeeting(around, current, section, horizonYears - elapsed) : null;
    const run = runSection(section, current, drivers, { elapsed, horizonYears, meeting });
    stretches.push({ section, run, from: elapsed });
    const last = run.states[run.states.length - 1] ?? { years: 0, a: current.a, c: current.c };
    elapsed += last.years;
    if (run.limit === PROXIMITY) {
      events.push(surfacing(section, last, elapsed));
      current = surfaced(current, section, last, elapsed);
    } else if (run.limit === NEIGHBOUR && around && meeting) {
      const ligamentMm = section.crackAt(last.a, last.c, elapsed).ligament;
      const joint = joinNeighbour(around, { a: last.a, c: last.c, ligamentMm }, meeting);
      events.push(joining(current, joint, last, elapsed));
      current = asJoined(current, joint);
    } else {
      const end = endOf(run, section, last, elapsed);
      if (end.end === 'through-wall') events.push(breakthrough(section, last, elapsed));
      return { path: growthStates(stretches, drivers), events, years: elapsed, ...end };
    }
  }
}

type Size = Pick<SizeAt, 'a' | 'c'>;

/** The embedded flaw that has come so near the face that it counts as breaking it. */
function surfacing(section: Section, { a }: Size, years: number): GrowthEvent {
  return {
    years,
    from: 'embedded',
    to: 'surface',
    heightBeforeMm: 2 * a,
    heightAfterMm: surfaceDepth(a, section.ligament(a, years)),
    rule: PROXIMITY_RULE,
  };
}

function surfaced(
  current: CharacterisedFlaw,
  section: Section,
  { a, c }: Size,
  years: number,
): CharacterisedFlaw {
  const depth = surfaceDepth(a, section.ligament(a, years));
  const { neighbourhood } = current;
  return {
    ...current,
    kind: 'surface',
    face: section.nearestFace(a),
    a: depth,
    c,
    ligament: 0,
    height: depth,
    recategorised: true,
    neighbourhood: neighbourhood && {
      ...neighbourhood,
      flaw: { ...neighbourhood.flaw, kind: 'surface', a: depth, c, ligamentMm: 0 },
    },
  };
}

const heightOf = (kind: FlawKind, a: number): number => (kind === 'embedded' ? 2 * a : a);

function joining(
  { kind }: CharacterisedFlaw,
  { flaw, rule }: Neighbourhood,
  before: Size,
  years: number,
): GrowthEvent {
  const same = kind === 'embedded' ? 'embedded' : 'surface';
  return {
    years,
    from: same,
    to: same,
    heightBeforeMm: heightOf(kind, before.a),
    heightAfterMm: heightOf(kind, flaw.a),
    lengthAfterMm: 2 * flaw.c,
    rule: `${rule.title}: it joins its neighbour`,
  };
}

const asJoined = (current: CharacterisedFlaw, neighbourhood: Neighbourhood): CharacterisedFlaw => ({
  ...current,
  a: neighbourhood.flaw.a,
  c: neighbourhood.flaw.c,
  ligament: neighbourhood.flaw.ligamentMm,
  height: heightOf(current.kind, neighbourhood.flaw.a),
  neighbourhood,
});

/** From when to when a section is followed, and when it meets a neighbour. */
interface Span {
  readonly elapsed: number;
  readonly horizonYears: number;
  readonly meeting: Meeting | null;
}

function runSection(
  section: Section,
  start: CharacterisedFlaw,
  drivers: GrowthDrivers,
  { elapsed, horizonYears: end, meeting }: Span,
): GrowthRun {
  const rates = growthRates(section, drivers, elapsed);
  const limits = limitsOf(section, drivers, elapsed);
  if (meeting) limits.unshift({ key: NEIGHBOUR, margin: (_a, _c, years) => meeting.years - years });
  const horizonYears = end - elapsed;
  const size = { a: start.a, c: start.c };
  // a jump in category may land on a limit at once
  const spent = limits.find(({ margin }) => !(margin(size.a, size.c, 0) > 0));
  if (spent) {
    const states = [{ years: 0, ...size }];
    return { stop: 'limit', limit: spent.key, states, distance: 0, evaluations: 0 };
  }
  // a wall that thins may start the growth of a flaw that stands still now
  if (drivers.thinning) return growWithTime(size, rates, limits, { horizonYears });
  return integrateGrowth(size, rates, limits, { horizonYears, states: DRAWN_STATES });
}

function limitsOf(section: Section, drivers: GrowthDrivers, elapsed: number): GrowthLimit[] {
  const limits: GrowthLimit[] = [
    { key: 'diagram', margin: (a, c, years) => section.margin(a, c, elapsed + years) },
    { key: 'validity', margin: (a, c, years) => section.validity(a, c, elapsed + years).room },
  ];
  if (section.kind === 'embedded') {
    limits.unshift({
      key: PROXIMITY,
      margin: (a, _c, years) => proximityMargin(a, section.ligament(a, elapsed + years)),
    });
  }
  const law = lawMargin(section, drivers, elapsed);
  if (law) limits.push({ key: 'growth law', margin: law });
  return limits;
}

/** The flaw that reaches the far face: from there on it is a leak. */
function breakthrough(
  section: Section,
  { a, c }: { readonly a: number; readonly c: number },
  years: number,
): GrowthEvent {
  const { thickness } = section.flaw.wall;
  return {
    years,
    from: 'surface',
    to: 'through-wall',
    heightBeforeMm: a,
    heightAfterMm: thickness,
    lengthAfterMm: 2 * throughWallHalfLength(a, c, thickness),
    rule: THROUGH_WALL_RULE,
  };
}

/** Kinds that become through-wall when the solution ends at their depth. */
const BREAKS_THROUGH = new Set<FlawKind>(['surface', 'extended surface', 'corner']);

function endOf(
  run: GrowthRun,
  section: Section,
  last: { readonly a: number; readonly c: number },
  years: number,
): { readonly end: GrowthEnd; readonly validityLimit: string | null } {
  switch (run.stop) {
    case 'horizon':
      return { end: 'horizon', validityLimit: null };
    case 'no growth':
      return { end: 'no growth', validityLimit: null };
    case 'step limit':
      return { end: 'outside validity', validityLimit: 'steps of the integration' };
    case 'limit': {
      if (run.limit === 'diagram') return { end: 'limit reached', validityLimit: null };
      if (run.limit === 'growth law') {
        return { end: 'outside validity', validityLimit: 'range of the growth law' };
      }
      const { limit } = section.validity(last.a, last.c, years);
      const through = limit?.name === DEPTH_RATIO && BREAKS_THROUGH.has(section.kind);
      return {
        end: through ? 'through-wall' : 'outside validity',
        validityLimit: limit?.text ?? null,
      };
    }
  }
}
