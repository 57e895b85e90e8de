import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { GrowthState } from '@ligament/domain/assessment/assessment-outcome';
import type { NamedOutline, Outline, SectionDrawing } from '../drawings/section-drawing';
import { dayText } from '../format/day-text';
import { numberText } from '../quantity/quantity-text';
import type { AssessedCase } from './assessed-case';
import { atLimit, atNextInspection, limitWord } from './milestones';

/** The section view of an assessed flaw. */
export function sectionOf(each: AssessedCase): SectionDrawing {
  const { input, outcome } = each;
  const now = outcome.path[0];
  const next = atNextInspection(each);
  return {
    wallMm: input.wall.thicknessMm.value,
    measured: measuredOutline(each),
    assessed: now
      ? named(input, now, `assessed ${mm(now.heightMm)}, with sizing allowance`)
      : measuredOutline(each),
    expected: next
      ? named(input, next.state, `expected at next inspection ${mm(next.state.heightMm)}`)
      : null,
    limiting: limitingOutline(each),
  };
}

const mm = (value: number) => `${numberText(value)} mm`;

function measuredOutline({ input, sizingError }: AssessedCase): NamedOutline {
  const { kind, face, heightMm, lengthMm } = input.flaw;
  const error = sizingError ? ` ± ${numberText(sizingError.heightMm)}` : '';
  return {
    kind,
    face,
    heightMm: heightMm.value,
    lengthMm: lengthMm.value,
    middleMm: middleOf(input),
    label: `measured ${numberText(heightMm.value)}${error} mm ${kind === 'surface' ? 'deep' : 'high'}`,
  };
}

/** Where the middle of an embedded flaw lies, from the inside surface; it stays there as the flaw grows. */
function middleOf({ wall, flaw }: AssessmentInput): number | null {
  if (flaw.kind === 'surface') return null;
  const fromFace = (flaw.ligamentMm?.value ?? 0) + flaw.heightMm.value / 2;
  return flaw.face === 'inside' ? fromFace : wall.thicknessMm.value - fromFace;
}

/** A flaw that has broken through its ligament opens to the face it was nearest to. */
function faceOf(input: AssessmentInput): 'inside' | 'outside' {
  const middle = middleOf(input);
  if (middle === null) return input.flaw.face;
  return middle <= input.wall.thicknessMm.value / 2 ? 'inside' : 'outside';
}

function outlineAt(
  input: AssessmentInput,
  { kind, heightMm, lengthMm }: Pick<GrowthState, 'kind' | 'heightMm' | 'lengthMm'>,
): Outline {
  return { kind, face: faceOf(input), heightMm, lengthMm, middleMm: middleOf(input) };
}

const named = (input: AssessmentInput, state: GrowthState, label: string): NamedOutline => ({
  ...outlineAt(input, state),
  label,
});

/** The flaw at the end of its predicted growth, or of limiting height at its present length. */
function limitingOutline(each: AssessedCase): NamedOutline | null {
  const { input, outcome } = each;
  const end = atLimit(each);
  if (end) {
    const words = `${limitWord(outcome.life.end)} ${mm(end.state.heightMm)}, ${dayText(end.on)}`;
    return named(input, end.state, words);
  }
  const now = outcome.path[0];
  const height = outcome.limitingHeightMm;
  if (height === null || !now) return null;
  return named(input, { ...now, heightMm: height }, `limiting ${mm(height)} at this length`);
}
