import {
  limitingLocus,
  type LocusEnd,
  type LocusPoint,
} from '../../fracture/limiting-flaw/limiting-locus';
import { hasHeight, hasLength } from '../../geometry/flaw-kind';
import { refused, type Refused } from '../../geometry/refusal';
import type { AssessmentInput } from '../assessment-input';
import { prepareCase } from '../prepare-case';
import type { Section } from '../section';

/** One point on the boundary of what is acceptable, as flaws are measured. */
export interface LimitingSizePoint {
  readonly lengthMm: number;
  /** Null where even a very shallow flaw is not acceptable. */
  readonly heightMm: number | null;
  readonly endedBy: LocusEnd;
}

/** Height against length of the flaws that are just acceptable in this wall under this load. */
export interface FlawLocus {
  readonly status: 'found';
  readonly points: readonly LimitingSizePoint[];
  /** The assessed flaw, allowance included. */
  readonly assessed: { readonly lengthMm: number; readonly heightMm: number };
  /** The flaw as measured; from there to the assessed one is the sizing allowance. */
  readonly measured: { readonly lengthMm: number; readonly heightMm: number };
}

/** Lengths looked at, against the assessed flaw. */
const RANGE = { shortest: 0.25, longest: 6 } as const;

/**
 * The limiting locus around the assessed flaw: every length has the height at which the flaw reaches the line
 * of the diagram or the end of the solutions.
 */
export function locusOfFlaw(input: AssessmentInput): FlawLocus | Refused {
  const prepared = prepareCase(input);
  if (prepared.status === 'refused') return prepared;
  const { section, flaw } = prepared;
  if (!hasHeight(flaw.kind) || !hasLength(flaw.kind)) return refused(oneExtent(flaw.kind));
  const { thickness } = section.flaw.wall;
  const span = section.kind === 'embedded' ? 2 : 1;
  const found = limitingLocus({
    margin: (a, c) => section.margin(a, c),
    validity: (a, c) => roomAt(section, a, c),
    thicknessMm: thickness / span,
    shortestHalfLengthMm: RANGE.shortest * flaw.c,
    longestHalfLengthMm: RANGE.longest * flaw.c,
    // the solutions say themselves how deep they hold
    deepestShare: 0.999,
  });
  if (found.status === 'refused') return found;
  return {
    status: 'found',
    points: found.points.map((point) => measuredPoint(section, point)),
    assessed: section.shown(flaw.a, flaw.c),
    measured: { lengthMm: input.flaw.lengthMm.value, heightMm: input.flaw.heightMm.value },
  };
}

/** Room to the limits; an embedded flaw keeps its place, so its ligament ends it too. */
const roomAt = (section: Section, a: number, c: number): number => {
  const { room } = section.validity(a, c);
  return section.kind === 'embedded' ? Math.min(room, section.ligament(a)) : room;
};

function measuredPoint(section: Section, point: LocusPoint): LimitingSizePoint {
  const { lengthMm, heightMm } = section.shown(point.depthMm ?? 0, point.halfLengthMm);
  return {
    lengthMm,
    heightMm: point.depthMm === null ? null : heightMm,
    endedBy: point.endedBy,
  };
}

const oneExtent = (kind: string) => ({
  input: 'flaw.kind',
  limit: 'a flaw with both a height and a length',
  value: kind,
  message: `A flaw of kind ${kind} has one extent only: its limiting size is one figure.`,
  instead: 'Read the limiting size of the assessment.',
});
