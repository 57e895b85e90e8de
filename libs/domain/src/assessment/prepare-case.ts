import type { AssessmentInput } from './assessment-input';
import type { Refusal, RefusedFlaw } from './assessment-outcome';
import { characterise, type CharacterisedFlaw } from './characterise';
import { checkInput } from './check-input';
import { validityRefusals } from './check-validity';
import { ENGINE_VERSION } from './engine-version';
import { diagramLineOf } from './diagram-line-of';
import { diagramMaterial, flawCase } from './flaw-case';
import { sectionOf, type Section } from './section';

/** A case whose inputs are possible and inside the limits of its solutions. */
export interface PreparedCase {
  readonly status: 'prepared';
  readonly flaw: CharacterisedFlaw;
  readonly section: Section;
}

/** Checks an input and sets it into its section, or refuses naming input, limit and value. */
export function prepareCase(input: AssessmentInput): PreparedCase | RefusedFlaw {
  const impossible = checkInput(input);
  if (impossible.length > 0) return refused(impossible);
  const chosen = diagramLineOf(input, diagramMaterial(input));
  if (chosen.status === 'refused') return refused(chosen.refusals);
  const flaw = characterise(input);
  const section = sectionOf(flawCase(input, chosen.line), flaw);
  const outside = validityRefusals(section.limits, section.crackAt(flaw.a, flaw.c));
  return outside.length > 0 ? refused(outside) : { status: 'prepared', flaw, section };
}

const refused = (refusals: readonly Refusal[]): RefusedFlaw => ({
  status: 'refused',
  engineVersion: ENGINE_VERSION,
  refusals,
});
