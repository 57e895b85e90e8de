import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { GrowthState } from '@ligament/domain/assessment/assessment-outcome';
import type { NamedOutline, Outline, SectionDrawing } from '../drawings/section-drawing';
import { hasHeight, lengthIsOneSided } from '@ligament/domain/geometry/flaw-kind';
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
      ? named(input, now, `assessed ${sizeText(now)}, with sizing allowance`)
      : measuredOutline(each),
    expected: next
      ? named(input, next.state, `expected at next inspection ${sizeText(next.state)}`)
      : null,
    limiting: limitingOutline(each),
  };
}

/** The extent that counts: height, or length where the flaw goes through the wall. */
const sizeText = ({
  kind,
  heightMm,
  lengthMm,
}: Pick<GrowthState, 'kind' | 'heightMm' | 'lengthMm'>) =>
  hasHeight(kind) ? mm(heightMm) : `${mm(lengthMm)} long`;

const mm = (value: number) => `${numberText(value)} mm`;

function measuredOutline({ input, sizingError }: AssessedCase): NamedOutline {
  const { kind, face, heightMm, lengthMm } = input.flaw;
  const height = hasHeight(kind) ? heightMm.value : input.wall.thicknessMm.value;
  const error = sizingError ? ` ± ${numberText(sizingError.heightMm)}` : '';
  return {
    kind,
    face,
    heightMm: height,
    lengthMm: lengthMm.value,
    oneSided: lengthIsOneSided(kind, input.wall.shape),
    middleMm: middleOf(input),
    label: hasHeight(kind)
      ? `measured ${numberText(height)}${error} mm ${kind === 'embedded' ? 'high' : 'deep'}`
      : `measured ${numberText(lengthMm.value)} mm long`,
  };
}

/** Where the middle of an embedded flaw lies, from the inside surface; it stays there as the flaw grows. */
function middleOf({ wall, flaw }: AssessmentInput): number | null {
  if (flaw.kind !== 'embedded') return null;
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
  return {
    kind,
    face: faceOf(input),
    heightMm,
    lengthMm,
    oneSided: lengthIsOneSided(kind, input.wall.shape),
    middleMm: middleOf(input),
  };
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
    const words = `${limitWord(outcome.life.end)} ${sizeText(end.state)}, ${dayText(end.on)}`;
    return named(input, end.state, words);
  }
  const now = outcome.path[0];
  if (!now) return null;
  const [height, length] = [outcome.limitingHeightMm, outcome.limitingLengthMm ?? null];
  if (length !== null)
    return named(input, { ...now, lengthMm: length }, `limiting ${mm(length)} long`);
  if (height === null) return null;
  return named(input, { ...now, heightMm: height }, `limiting ${mm(height)} at this length`);
}
