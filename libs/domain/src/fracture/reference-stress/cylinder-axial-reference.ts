import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import { foliasFactor } from './bulging-factor';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'BS 7910 Annex P, axial internal surface flaw (from memory)';

/**
 * Reference stress of an axial surface crack in a cylinder: 1.2 Ms Pm + 2 Pb/[3 (1 − α″)²], with
 * Ms = [1 − a/(B MT)]/(1 − a/B), MT = √(1 + 1.6 c²/(r B)) and α″ = (a/B)/(1 + B/c).
 * @param crack crack and wall: a, c, t, Ri [mm]
 * @param membrane primary membrane stress (hoop), Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity a/B < 1; Pm ≥ 0, Pb taken without its sign; a vanishing flaw gives 1.2 Pm, a deliberate margin
 * @source BS 7910 Annex P, axial internal surface flaw (from memory)
 * @example cylinderAxialReference(crackOf({ a: 1e-6, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)) // 240
 */
export function cylinderAxialReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness, insideRadius } = crack;
  const depth = a / thickness;
  if (!(depth < 1)) return Number.POSITIVE_INFINITY as MPa;
  const mt = foliasFactor(c, insideRadius + thickness / 2, thickness);
  const surface = (1 - depth / mt) / (1 - depth);
  const left = 1 - depth / (1 + thickness / c);
  return (1.2 * surface * membrane + (2 * Math.abs(bending)) / (3 * left * left)) as MPa;
}

export const CYLINDER_AXIAL_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-axial',
  title: 'Axial surface flaw in a cylinder',
  source: SOURCE,
  formula:
    'σref = 1.2 Ms Pm + 2 Pb/[3 (1 − α″)²], Ms = [1 − a/(t MT)]/(1 − a/t), MT = √(1 + 1.6 c²/(Rm t))',
  basis:
    'Local collapse of the ligament with bulging. The factor 1.2 stands for a vanishing flaw too: a deliberate margin of the form.',
  scope: 'local',
  vanishing: 'margin',
  limits: [],
  stress: cylinderAxialReference,
};

export const CYLINDER_AXIAL_OUTSIDE_REFERENCE: ReferenceStressSolution = {
  ...CYLINDER_AXIAL_REFERENCE,
  key: 'cylinder-axial-outside',
  title: 'Axial surface flaw outside a cylinder',
  basis: `The form for an inside flaw, used for an outside one as common practice. ${CYLINDER_AXIAL_REFERENCE.basis}`,
};
