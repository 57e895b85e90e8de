import { lengthIsOneSided, type FlawKind } from '../geometry/flaw-kind';
import { becomesSurface, surfaceDepth } from '../growth/recategorise';
import type { AssessmentInput } from './assessment-input';
import { combineNeighbours, type Neighbourhood } from './combine-neighbours';
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
  /** What it was combined with, and what lies beside it; null without neighbours. */
  readonly neighbourhood: Neighbourhood | null;
}

export const OTHER_FACE = { inside: 'outside', outside: 'inside' } as const;

/** Adds allowance and factor on size, combines neighbours, and applies the rule for flaws close to a face. */
export function characterise(input: AssessmentInput): CharacterisedFlaw {
  const { flaw, wall } = input;
  const t = wall.thicknessMm.value;
  const sized = sizeOf(input);
  const c = lengthIsOneSided(flaw.kind, wall.shape) ? sized.sizedLength : sized.sizedLength / 2;
  const plain = {
    ...sized,
    kind: flaw.kind,
    face: flaw.face,
    c,
    ligament: 0,
    recategorised: false,
    neighbourhood: null,
  };
  switch (flaw.kind) {
    case 'embedded':
    case 'surface':
      return { ...sized, ...inItsPlace(input, sized.sizedHeight, c) };
    case 'through-wall':
      return { ...plain, a: t, height: t };
    case 'edge':
      return { ...plain, a: sized.sizedLength, height: t };
    default:
      return { ...plain, a: sized.sizedHeight, height: sized.sizedHeight };
  }
}

function sizeOf(input: AssessmentInput) {
  const { flaw, sizing } = input;
  const { size } = factorsOf(input);
  return {
    sizedHeight: size * (flaw.heightMm.value + sizing.heightAllowanceMm.value),
    sizedLength: size * (flaw.lengthMm.value + sizing.lengthAllowanceMm.value),
  };
}

type Placed = Omit<CharacterisedFlaw, 'sizedHeight' | 'sizedLength'>;

/** A surface or embedded flaw, with what it interacts with, in the category the rules put it in. */
function inItsPlace(input: AssessmentInput, height: number, c: number): Placed {
  const { flaw } = input;
  const surface = flaw.kind === 'surface';
  // allowance and factor grow an embedded flaw about its centre
  const grown = (height - flaw.heightMm.value) / 2;
  const own = {
    kind: surface ? ('surface' as const) : ('embedded' as const),
    a: surface ? height : height / 2,
    c,
    ligamentMm: surface ? 0 : Math.max((flaw.ligamentMm?.value ?? 0) - grown, 0),
  };
  const neighbourhood = input.neighbours?.length ? combineNeighbours(input, own) : null;
  const whole = neighbourhood?.flaw ?? own;
  const placed =
    whole.kind === 'surface'
      ? { kind: 'surface' as const, face: flaw.face, height: whole.a, recategorised: false }
      : embedded(input, whole.a, whole.ligamentMm);
  return {
    a: whole.a,
    c: whole.c,
    ligament: whole.kind === 'surface' ? 0 : whole.ligamentMm,
    ...placed,
    neighbourhood,
  };
}

/** An embedded flaw, or the surface flaw it counts as when its ligament is too small. */
function embedded({ flaw, wall }: AssessmentInput, a: number, ligament: number) {
  const other = wall.thicknessMm.value - 2 * a - ligament;
  const nearest = Math.min(ligament, other);
  if (wall.shape === 'round bar' || !becomesSurface(a, nearest)) {
    return { kind: 'embedded', face: flaw.face, height: 2 * a, recategorised: false } as const;
  }
  const depth = surfaceDepth(a, Math.max(nearest, 0));
  const face = ligament <= other ? flaw.face : OTHER_FACE[flaw.face];
  return {
    kind: 'surface',
    face,
    a: depth,
    ligament: 0,
    height: depth,
    recategorised: true,
  } as const;
}
