import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'BS 7910 Annex P, circumferential internal surface flaw (from memory)';

const ANGLE_LIMIT: Limit = {
  name: 'c/(π Ri)',
  text: '2c at most half the circumference of the bore',
  min: 0,
  max: 0.5,
  measure: ({ c, insideRadius }) => c / (Math.PI * insideRadius),
  source: SOURCE,
  input: 'flaw.lengthMm',
  instead: 'Assess as a flaw round the full circumference, or ask a specialist.',
};

/**
 * Reference stress of a circumferential surface crack in a cylinder:
 * Pm [π (1 − a/B) + 2 (a/B) sin(c/ri)]/[(1 − a/B)(π − (c/ri)(a/B))] + 2 Pb/[3 (1 − α″)²].
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param membrane primary membrane stress along the axis, Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity c ≤ π ri/2, a/B < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910 Annex P, circumferential internal surface flaw (from memory)
 * @example cylinderCircumferentialReference(crackOf({ a: 1e-9, c: 40, t: 25, Ri: 750 }), mpa(100), mpa(60)) // 140
 */
export function cylinderCircumferentialReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness, insideRadius } = crack;
  const depth = a / thickness;
  if (!(depth < 1)) return Number.POSITIVE_INFINITY as MPa;
  // beyond the whole circumference there is no more to crack
  const angle = Math.min(c / insideRadius, Math.PI);
  const section =
    (Math.PI * (1 - depth) + 2 * depth * Math.sin(angle)) /
    ((1 - depth) * (Math.PI - angle * depth));
  const left = 1 - depth / (1 + thickness / c);
  return (membrane * section + (2 * Math.abs(bending)) / (3 * left * left)) as MPa;
}

export const CYLINDER_CIRCUMFERENTIAL_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-circumferential',
  title: 'Circumferential surface flaw in a cylinder',
  source: SOURCE,
  formula:
    'σref = Pm [π (1 − a/t) + 2 (a/t) sin(c/Ri)]/[(1 − a/t)(π − (c/Ri)(a/t))] + 2 Pb/[3 (1 − α″)²]',
  basis:
    'Collapse of the cracked section of the cylinder; bending of the shell wall added, so that a vanishing flaw gives Pm + 2 Pb/3.',
  scope: 'global',
  vanishing: 'margin',
  limits: [ANGLE_LIMIT],
  stress: cylinderCircumferentialReference,
};

export const CYLINDER_CIRCUMFERENTIAL_OUTSIDE_REFERENCE: ReferenceStressSolution = {
  ...CYLINDER_CIRCUMFERENTIAL_REFERENCE,
  key: 'cylinder-circumferential-outside',
  title: 'Circumferential surface flaw outside a cylinder',
  basis:
    'The form for an inside flaw with the inside radius: the flaw then spans a larger angle than it does outside, an upper estimate.',
};
