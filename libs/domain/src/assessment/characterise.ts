import type { AssessmentInput } from './assessment-input';
import { becomesSurface, surfaceDepth } from '../growth/recategorise';

/** The flaw as it is assessed: measured size with allowance, in the category the rules put it in. */
export interface CharacterisedFlaw {
  readonly kind: 'surface' | 'embedded';
  /** Face it opens to, or is nearest to. */
  readonly face: 'inside' | 'outside';
  readonly a: number;
  readonly c: number;
  readonly ligament: number;
  /** Through-wall extent: a, or 2a when embedded. */
  readonly height: number;
  /** An embedded flaw so near the face that it is assessed as surface-breaking. */
  readonly recategorised: boolean;
}

export const OTHER_FACE = { inside: 'outside', outside: 'inside' } as const;

/** Adds the sizing allowance and applies the rule for flaws close to a face. */
export function characterise({ flaw, sizing, wall }: AssessmentInput): CharacterisedFlaw {
  const height = flaw.heightMm.value + sizing.heightAllowanceMm.value;
  const c = (flaw.lengthMm.value + sizing.lengthAllowanceMm.value) / 2;
  if (flaw.kind === 'surface') {
    return {
      kind: 'surface',
      face: flaw.face,
      a: height,
      c,
      ligament: 0,
      height,
      recategorised: false,
    };
  }
  const a = height / 2;
  const measured = (flaw.ligamentMm?.value ?? 0) - sizing.heightAllowanceMm.value / 2;
  const ligament = Math.max(measured, 0);
  const other = wall.thicknessMm.value - height - ligament;
  const nearest = Math.min(ligament, other);
  if (!becomesSurface(a, nearest)) {
    return { kind: 'embedded', face: flaw.face, a, c, ligament, height, recategorised: false };
  }
  const depth = surfaceDepth(a, nearest);
  const face = ligament <= other ? flaw.face : OTHER_FACE[flaw.face];
  return { kind: 'surface', face, a: depth, c, ligament: 0, height: depth, recategorised: true };
}
