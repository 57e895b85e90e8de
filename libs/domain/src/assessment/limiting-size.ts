import { proximityMargin } from '../growth/recategorise';
import { firstCrossing } from '../numerics/first-crossing';
import { limitingExtent, type LimitingExtent } from './limiting-extent';
import type { CharacterisedFlaw } from './characterise';
import { number } from './number-text';
import type { Section } from './section';

/** The size at which the flaw would stop being acceptable, its other extent as it is. */
export interface LimitingSize {
  readonly heightMm: number | null;
  /** Of a flaw through the wall or the edge, whose length alone can change. */
  readonly lengthMm: number | null;
  readonly because: string;
}

/** Longest through-wall flaw that is looked at [mm]. */
const LONGEST = 1e4;

/** Limiting size of the assessed flaw; an embedded flaw grows about its centre. */
export function limitingSize(section: Section, { a, c }: CharacterisedFlaw): LimitingSize {
  const { kind } = section;
  const { thickness } = section.flaw.wall;
  if (kind === 'through-wall') {
    const found = search(section, (half) => [a, half], LONGEST);
    return lengthOf(found, (half) => section.shown(a, half).lengthMm);
  }
  if (kind === 'edge') {
    const found = search(section, (length) => [length, length], LONGEST);
    return lengthOf(found, (length) => length);
  }
  const share = kind === 'embedded' ? 2 : 1;
  const found = search(section, (depth) => [depth, c], thickness / share);
  const heightMm = found.extent === null ? null : share * found.extent;
  return { heightMm, lengthMm: null, because: found.because };
}

const lengthOf = (found: LimitingExtent, length: (x: number) => number): LimitingSize => ({
  heightMm: null,
  lengthMm: found.extent === null ? null : length(found.extent),
  because: found.because,
});

/** First size that reaches the line, or the end of validity before that. */
function search(
  section: Section,
  size: (x: number) => readonly [a: number, c: number],
  most: number,
): LimitingExtent {
  const room = (x: number) => {
    const [a, c] = size(x);
    const validity = section.validity(a, c).room;
    return section.kind === 'embedded'
      ? Math.min(validity, proximityMargin(a, section.ligament(a)))
      : validity;
  };
  const end = firstCrossing(room, most * 1e-4, most, { tolerance: 1e-10 });
  const largest = (end.status === 'found' ? end.x : most) * (1 - 1e-9);
  return limitingExtent({
    margin: (x) => section.margin(...size(x)),
    largest,
    largestBecause: endOfRange(section, size(largest)),
  });
}

function endOfRange(section: Section, [a, c]: readonly [number, number]): string {
  const { room, limit } = section.validity(a, c);
  if (section.kind === 'embedded' && room > 1e-6) {
    return 'The flaw would count as surface-breaking there; it stays inside the diagram until then.';
  }
  const where =
    room > 1e-6 ? `no longer one was looked at` : (limit?.text ?? `a = ${number(a)} mm`);
  return `The range of the solution ends there (${where}); the flaw stays inside the diagram until then.`;
}
