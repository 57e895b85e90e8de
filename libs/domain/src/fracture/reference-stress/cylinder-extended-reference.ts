import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';
import { shellBending } from './sound-wall';

const AXIAL = 'BS 7910 Annex P, axial surface flaw without end, 2005 form (from memory)';
const AROUND = 'equilibrium of the ligament; shell bending: BS 7910 Annex P (from memory)';

/**
 * Reference stress of an axial surface flaw without end in a cylinder: 1.2 Pm/(1 − a/B) + 2 Pb/[3 (1 − a/B)²].
 * @param crack crack and wall: a, t [mm]
 * @param membrane primary membrane stress (hoop), Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity a < B; Pm ≥ 0, Pb taken without its sign; the limit of the form for a surface flaw of great length
 * @source BS 7910 Annex P, axial surface flaw without end, 2005 form (from memory)
 * @example axialExtendedReference(crackOf({ a: 5, c: 1e9, t: 25, Ri: 750 }), mpa(100), mpa(0)) // 150
 */
export function axialExtendedReference({ a, thickness }: Crack, membrane: MPa, bending: MPa): MPa {
  const depth = a / thickness;
  if (!(depth < 1)) return Number.POSITIVE_INFINITY as MPa;
  return ((1.2 * membrane) / (1 - depth) + shellBending(bending, depth)) as MPa;
}

/** Area of the whole ring over that of the ligament around a full-circumference flaw. */
function ringRatio({ a, thickness, insideRadius }: Crack, face: 'inside' | 'outside'): number {
  const outside = insideRadius + thickness;
  const whole = outside ** 2 - insideRadius ** 2;
  return face === 'inside'
    ? whole / (outside ** 2 - (insideRadius + a) ** 2)
    : whole / ((outside - a) ** 2 - insideRadius ** 2);
}

/**
 * Reference stress of a flaw around the full circumference of a cylinder: the force over the ligament's own
 * area, plus 2 Pb/[3 (1 − a/B)²].
 * @param crack crack and wall: a, t, Ri [mm]
 * @param membrane primary membrane stress along the axis, Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @param face face the flaw opens to [-]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity a < B; Pm ≥ 0, Pb taken without its sign
 * @source equilibrium of the ligament; shell bending: BS 7910 Annex P (from memory)
 * @example fullCircumferenceReference(crackOf({ a: 5, c: 5, t: 10, Ri: 50 }), mpa(100), mpa(0), 'inside') // 191.3043478
 */
export function fullCircumferenceReference(
  crack: Crack,
  membrane: MPa,
  bending: MPa,
  face: 'inside' | 'outside',
): MPa {
  const depth = crack.a / crack.thickness;
  if (!(depth < 1)) return Number.POSITIVE_INFINITY as MPa;
  return (membrane * ringRatio(crack, face) + shellBending(bending, depth)) as MPa;
}

export const CYLINDER_AXIAL_EXTENDED_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-axial-extended',
  title: 'Axial surface flaw without end in a cylinder',
  source: AXIAL,
  formula: 'σref = 1.2 Pm/(1 − a/t) + 2 Pb/[3 (1 − a/t)²]',
  basis:
    'Collapse of the ligament. The factor 1.2 stands for a vanishing flaw too: a deliberate margin of the form.',
  scope: 'local',
  vanishing: 'margin',
  limits: [],
  stress: axialExtendedReference,
};

const around = (face: 'inside' | 'outside'): ReferenceStressSolution => ({
  key: `cylinder-circumferential-full-${face}`,
  title: `Flaw around the full circumference, ${face} a cylinder`,
  source: AROUND,
  formula: 'σref = Pm A/A(ligament) + 2 Pb/[3 (1 − a/t)²]',
  basis:
    'Collapse of the ring that is left; bending of the shell wall added, so that a vanishing flaw gives Pm + 2 Pb/3.',
  scope: 'global',
  vanishing: 'margin',
  limits: [],
  stress: (crack, membrane, bending) => fullCircumferenceReference(crack, membrane, bending, face),
});

export const CYLINDER_FULL_INSIDE_REFERENCE = around('inside');
export const CYLINDER_FULL_OUTSIDE_REFERENCE = around('outside');
