import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { MPa } from '../../units/quantity';
import { bulgingFactor, foliasFactor } from './bulging-factor';
import type { ReferenceStressSolution } from './solution';
import { shellBending } from './sound-wall';

const BS = 'BS 7910 Annex P, axial through-thickness flaw, 2005 form (from memory)';
const API = 'API 579-1 Annex 9C, axial through-wall crack (from memory)';
const NET =
  'net-section collapse of a pipe free to rotate at its ends (ASME XI Appendix C form, from memory)';

const meanRadius = ({ insideRadius, thickness }: Crack) => insideRadius + thickness / 2;

/**
 * Reference stress of an axial crack through the wall of a cylinder: 1.2 MT Pm + 2 Pb/3,
 * MT = √(1 + 1.6 c²/(r B)).
 * @param crack crack and wall: c, t, Ri [mm]
 * @param membrane primary membrane stress (hoop), Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity thin shell; Pm ≥ 0, Pb taken without its sign; a vanishing flaw gives 1.2 Pm + 2 Pb/3
 * @source BS 7910 Annex P, axial through-thickness flaw, 2005 form (from memory)
 * @example axialThroughWallReference(crackOf({ a: 25, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)) // 255.6078964
 */
export function axialThroughWallReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const bulging = foliasFactor(crack.c, meanRadius(crack), crack.thickness);
  return (1.2 * bulging * membrane + shellBending(bending, 0)) as MPa;
}

/**
 * The same by another code: [Pb + √(Pb² + 9 (Mt Pm)²)]/3.
 * @param crack crack and wall: c, t, Ri [mm]
 * @param membrane primary membrane stress (hoop), Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity thin shell; Pm ≥ 0, Pb taken without its sign; Mt is 1.00995 for a vanishing flaw
 * @source API 579-1 Annex 9C, axial through-wall crack (from memory); Mt from equation 9C.8
 * @example axialThroughWallApiReference(crackOf({ a: 25, c: 40, t: 25, Ri: 750 }), mpa(200), mpa(0)) // 213.2065323
 */
export function axialThroughWallApiReference(
  { c, thickness, insideRadius }: Crack,
  membrane: MPa,
  bending: MPa,
): MPa {
  const bulging = bulgingFactor((1.818 * c) / Math.sqrt(insideRadius * thickness));
  const pb = Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * bulging * membrane)) / 3) as MPa;
}

/**
 * Share of the tension that a pipe with a circumferential crack through its wall carries at collapse, free to
 * rotate: 1 − θ/π − (2/π) asin(½ sin θ).
 * @param halfAngle half of the angle the crack spans, θ [rad]
 * @returns share, 1 without a crack, 0 when it is gone [-]
 * @validity 0 ≤ θ ≤ π
 * @source net-section collapse, ASME XI Appendix C form (from memory); moment equilibrium of the section
 * @example pipeTensionLeft(0.5) // 0.6867385191
 */
export const pipeTensionLeft = (halfAngle: number): number =>
  1 - halfAngle / Math.PI - (2 / Math.PI) * Math.asin(Math.sin(halfAngle) / 2);

/**
 * Reference stress of a circumferential crack through the wall of a pipe in tension, bending of the shell
 * wall added: Pm/[1 − θ/π − (2/π) asin(½ sin θ)] + 2 Pb/3, θ = c/Rm.
 * @param crack crack and wall: c, t, Ri [mm]
 * @param membrane primary membrane stress along the axis, Pm [MPa]
 * @param bending primary bending stress through the wall, Pb [MPa]
 * @returns reference stress, σref; Infinity once nothing is left [MPa]
 * @validity θ < π/2 as a limit of the catalogue; Pm ≥ 0, Pb taken without its sign
 * @source net-section collapse of a pipe (ASME XI Appendix C form, from memory)
 * @example circumferentialThroughWallReference(crackOf({ a: 20, c: 100, t: 20, Ri: 190 }), mpa(100), mpa(0)) // 145.6158307934
 */
export function circumferentialThroughWallReference(
  crack: Crack,
  membrane: MPa,
  bending: MPa,
): MPa {
  const left = pipeTensionLeft(crack.c / meanRadius(crack));
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  return (membrane / left + shellBending(bending, 0)) as MPa;
}

const ANGLE: Limit = {
  name: 'θ/π',
  text: '2c at most half the circumference',
  min: 0,
  max: 0.5,
  measure: (crack) => crack.c / (Math.PI * meanRadius(crack)),
  source: NET,
  input: 'flaw.lengthMm',
  instead: 'Half of the pipe is cracked: repair, or ask a specialist.',
};

export const CYLINDER_AXIAL_THROUGH_WALL_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-axial-through-wall',
  title: 'Axial flaw through the wall of a cylinder',
  source: BS,
  formula: 'σref = 1.2 MT Pm + 2 Pb/3, MT = √(1 + 1.6 c²/(Rm t))',
  basis:
    'Collapse with bulging. The factor 1.2 stands for a vanishing flaw too: a deliberate margin of the form.',
  scope: 'global',
  vanishing: 'margin',
  limits: [],
  stress: axialThroughWallReference,
};

export const CYLINDER_AXIAL_THROUGH_WALL_API_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-axial-through-wall-api',
  title: 'Axial flaw through the wall of a cylinder, second form',
  source: API,
  formula: 'σref = [Pb + √(Pb² + 9 (Mt Pm)²)]/3',
  basis: 'Collapse with bulging; the fit of Mt is 1 % high for a vanishing flaw.',
  scope: 'global',
  vanishing: 'margin',
  limits: [],
  stress: axialThroughWallApiReference,
};

export const CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_REFERENCE: ReferenceStressSolution = {
  key: 'cylinder-circumferential-through-wall',
  title: 'Circumferential flaw through the wall of a cylinder',
  source: NET,
  formula: 'σref = Pm/[1 − θ/π − (2/π) asin(½ sin θ)] + 2 Pb/3, θ = c/Rm',
  basis:
    'Collapse of the pipe’s section, free to rotate; bending of the shell wall added, so that a vanishing flaw gives Pm + 2 Pb/3.',
  scope: 'global',
  vanishing: 'margin',
  limits: [ANGLE],
  stress: circumferentialThroughWallReference,
};
