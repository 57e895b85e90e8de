import { lengthIsOneSided, type FlawKind } from '../geometry/flaw-kind';
import { becomesSurface, surfaceDepth } from '../growth/recategorise';
import type { AssessmentInput } from './assessment-input';
import { factorsOf } from './partial-factors';

/** The flaw as it is assessed: measured size with allowance, in the category the rules put it in. */
export interface CharacterisedFlaw {
  readonly kind: FlawKind;
  /** Face it opens to, or is nearest to. */
  readonly face: 'inside' | 'outside';
  /** Depth, or half height when embedded; length of an edge flaw; the wall when it goes through [mm]. */
  readonly a: number;
  /** Half length; the length itself where it is measured from an edge [mm]. */
  readonly c: number;
  readonly ligament: number;
  /** Through-wall extent: a, 2a when embedded, the wall when it goes through. */
  readonly height: number;
  /** Measured height and length with allowance and factor, before any rule changed the category [mm]. */
  readonly sizedHeight: number;
  readonly sizedLength: number;
  /** An embedded flaw so near the face that it is assessed as surface-breaking. */
  readonly recategorised: boolean;
}

export const OTHER_FACE = { inside: 'outside', outside: 'inside' } as const;

/** Adds the sizing allowance and the factor on size, and applies the rule for flaws close to a face. */
export function characterise(input: AssessmentInput): CharacterisedFlaw {
  const { flaw, sizing, wall } = input;
  const { size } = factorsOf(input);
  const t = wall.thicknessMm.value;
  const height = size * (flaw.heightMm.value + sizing.heightAllowanceMm.value);
  const length = size * (flaw.lengthMm.value + sizing.lengthAllowanceMm.value);
  const c = lengthIsOneSided(flaw.kind, wall.shape) ? length : length / 2;
  const sized = { sizedHeight: height, sizedLength: length };
  const plain = {
    ...sized,
    kind: flaw.kind,
    face: flaw.face,
    c,
    ligament: 0,
    recategorised: false,
  };
  switch (flaw.kind) {
    case 'embedded':
      return { ...sized, ...embedded(input, height, c) };
    case 'through-wall':
      return { ...plain, a: t, height: t };
    case 'edge':
      return { ...plain, a: length, height: t };
    default:
      return { ...plain, a: height, height };
  }
}

/** An embedded flaw in its place, or the surface flaw it counts as when its ligament is too small. */
function embedded(
  { flaw, wall }: AssessmentInput,
  height: number,
  c: number,
): Omit<CharacterisedFlaw, 'sizedHeight' | 'sizedLength'> {
  const a = height / 2;
  const t = wall.thicknessMm.value;
  // allowance and factor grow the flaw about its centre
  const grown = (height - flaw.heightMm.value) / 2;
  const ligament = Math.max((flaw.ligamentMm?.value ?? 0) - grown, 0);
  const other = t - height - ligament;
  const nearest = Math.min(ligament, other);
  const kept = { face: flaw.face, a, c, ligament, height };
  if (wall.shape === 'round bar') return { ...kept, kind: 'embedded', recategorised: false };
  if (!becomesSurface(a, nearest)) return { ...kept, kind: 'embedded', recategorised: false };
  const depth = surfaceDepth(a, Math.max(nearest, 0));
  const face = ligament <= other ? flaw.face : OTHER_FACE[flaw.face];
  return { kind: 'surface', face, a: depth, c, ligament: 0, height: depth, recategorised: true };
}
