import { CHI_SIMPLE_LIMIT, chi } from '../fracture/fad/interaction';
import type { AssessmentInput } from './assessment-input';
import { growthCautions } from './check-growth';
import type { CharacterisedFlaw } from './characterise';
import { number } from './number-text';
import type { Section } from './section';
import type { Standing } from './standing';

const STANDING =
  'This result supports the judgement of a competent person; the code and regulations in force at the site and the owner’s procedures decide.';

export interface CautionSubject {
  readonly input: AssessmentInput;
  readonly flaw: CharacterisedFlaw;
  readonly section: Section;
  readonly point: Standing;
  readonly assumed: readonly string[];
  readonly checks: readonly { readonly name: string; readonly near: boolean }[];
}

/** What the reader must know though it does not stop the verdict; the most telling first. */
export function cautions(subject: CautionSubject): readonly string[] {
  const { input, flaw, section, point, assumed, checks } = subject;
  const near = checks.filter((check) => check.near).map(({ name }) => name);
  return [
    elasticSize(subject),
    flaw.recategorised
      ? `The embedded flaw is so near the face that it is assessed as a surface flaw ${number(flaw.a)} mm deep.`
      : null,
    input.growth.stressCorrosion || input.growth.withTime
      ? 'Stress corrosion can be far faster than any rate given here if the chemistry changes; branched cracks are easily undersized.'
      : null,
    (input.growth.stressCorrosion || input.growth.withTime) && section.kind === 'embedded'
      ? 'Stress corrosion is given for an embedded flaw, which the medium does not reach before it breaks the surface.'
      : null,
    section.flaw.facePressure > 0 && input.growth.fatigue
      ? 'Pressure on the crack faces counts in the static check only: add its range to the membrane ranges of the cycle blocks.'
      : null,
    chi(point.at.kPrimary, point.at.kSecondary, point.lr) > CHI_SIMPLE_LIMIT
      ? 'Secondary stress is large against primary (χ above 4): the interaction term goes beyond the simple form.'
      : null,
    section.kind === 'edge'
      ? 'For a flaw through the edge, membrane and bending are those over the width of the plate; bending through its thickness belongs to the membrane stress.'
      : null,
    ...growthCautions(input),
    input.growth.thinning
      ? 'The wall corrodes while the flaw grows: its least thickness for pressure is not judged here.'
      : null,
    near.length > 0 ? `Close to a limit of the solution: ${near.join(', ')}.` : null,
    assumed.length > 0
      ? `${assumed.length} input${assumed.length > 1 ? 's rest' : ' rests'} on an assumption or a standard’s default.`
      : null,
    STANDING,
  ].filter((text) => text !== null);
}

/** Size demanded for linear-elastic use alone: 2.5 (K/σY)² against flaw and ligament. */
function elasticSize({ flaw, section, point }: CautionSubject): string | null {
  const kTotal = point.at.kPrimary + point.at.kSecondary;
  const needed = 2.5 * (kTotal / section.flaw.material.yieldMPa) ** 2;
  const ligament = section.ligament(flaw.a);
  if (flaw.a >= needed && ligament >= needed) return null;
  return `The plastic zone is large: 2.5 (K/σY)² = ${number(needed)} mm is above ${flaw.a < needed ? `a = ${number(flaw.a)} mm` : `the ligament, ${number(ligament)} mm`}. K alone would not be valid here; the failure assessment diagram covers this with Lr.`;
}
