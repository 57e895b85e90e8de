import { firstCrossing } from '../numerics/first-crossing';
import { proximityMargin } from '../growth/recategorise';
import type { CharacterisedFlaw } from './characterise';
import { limitingHeight, type LimitingHeight } from './limiting-height';
import { number } from './number-text';
import type { Section } from './section';

/** Limiting height of the assessed flaw at its present length; an embedded flaw grows about its centre. */
export function limitingSize(section: Section, { c }: CharacterisedFlaw): LimitingHeight {
  const share = section.kind === 'surface' ? 1 : 2;
  const { thickness } = section.flaw.wall;
  const room = (a: number) => {
    const validity = section.validity(a, c).room;
    return section.kind === 'surface'
      ? validity
      : Math.min(validity, proximityMargin(a, section.ligament(a)));
  };
  const end = firstCrossing(room, thickness * 1e-4, thickness / share, { tolerance: 1e-10 });
  const largest = end.x * (1 - 1e-9);
  const found = limitingHeight({
    margin: (a) => section.margin(a, c),
    largest,
    largestBecause: endOfRange(section, largest, c),
  });
  return { ...found, heightMm: found.heightMm === null ? null : share * found.heightMm };
}

function endOfRange(section: Section, a: number, c: number): string {
  const { room, limit } = section.validity(a, c);
  return section.kind === 'embedded' && room > 1e-6
    ? 'The flaw would count as surface-breaking there; it stays inside the diagram until then.'
    : `The range of the solution ends there (${limit?.text ?? `a = ${number(a)} mm`}); the flaw stays inside the diagram until then.`;
}
