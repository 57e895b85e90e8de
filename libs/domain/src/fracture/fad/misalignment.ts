/**
 * Stress magnification of an axial offset at a butt joint of equal walls: km = 1 + 3 e/t.
 * @param offset offset of the middle lines, e [mm]
 * @param thickness wall thickness, t [mm]
 * @returns magnification of the membrane stress at the surface, km [-]
 * @validity e small against t; wall free to bend
 * @source BS 7910:2013 Annex D, IIW (from memory)
 * @example axialMisalignment(1.5, 15) // 1.3
 */
export const axialMisalignment = (offset: number, thickness: number): number =>
  1 + (3 * offset) / thickness;

/**
 * Magnification in the thinner of two unequal walls: km = 1 + (6 e/t1) t1^n/(t1^n + t2^n), n = 1.5.
 * @param offset offset of the middle lines, e [mm]
 * @param thinner thickness of the thinner wall, t1 [mm]
 * @param thicker thickness of the thicker wall, t2 [mm]
 * @returns magnification of the membrane stress at the surface of the thinner wall, km [-]
 * @validity t1 ≤ t2; unrestrained joint
 * @source BS 7910:2013 Annex D, IIW (from memory)
 * @example unequalMisalignment(5, 10, 20) // 1.783611625
 */
export function unequalMisalignment(offset: number, thinner: number, thicker: number): number {
  const own = thinner ** 1.5;
  return 1 + ((6 * offset) / thinner) * (own / (own + thicker ** 1.5));
}

/** An angle between two walls at a butt joint. */
export interface AngularJoint {
  /** Height of the peak over the chord, y [mm]. */
  readonly peakMm: number;
  readonly thicknessMm: number;
  /** From the joint to its support, l: half the chord [mm]. */
  readonly halfLengthMm: number;
  /** Membrane stress, which straightens the joint, σm [MPa]. */
  readonly membraneMPa: number;
  readonly youngsModulusMPa: number;
  readonly ends: 'fixed' | 'pinned';
}

/**
 * Magnification of an angle at a butt joint. Fixed ends: km = 1 + (3 y/t) tanh(β/2)/(β/2); pinned:
 * km = 1 + (6 y/t) tanh(β)/β; β = (2 l/t) √(3 σm/E).
 * @param joint peak y, thickness, half length l [mm], membrane stress and modulus [MPa], ends
 * @returns magnification of the membrane stress at the surface, km [-]
 * @validity σm ≥ 0: compression does not straighten
 * @source BS 7910:2013 Annex D, IIW (from memory)
 * @example angularMisalignment({ peakMm: 2, thicknessMm: 20, halfLengthMm: 300, membraneMPa: 150, youngsModulusMPa: 207000, ends: 'fixed' }) // 1.259075642
 */
export function angularMisalignment(joint: AngularJoint): number {
  const { peakMm, thicknessMm, halfLengthMm, membraneMPa, youngsModulusMPa, ends } = joint;
  const beta =
    ((2 * halfLengthMm) / thicknessMm) *
    Math.sqrt((3 * Math.max(membraneMPa, 0)) / youngsModulusMPa);
  return ends === 'fixed'
    ? 1 + ((3 * peakMm) / thicknessMm) * straightening(beta / 2)
    : 1 + ((6 * peakMm) / thicknessMm) * straightening(beta);
}

// tanh(x)/x, 1 without stress
const straightening = (x: number): number => (x > 0 ? Math.tanh(x) / x : 1);

/** A cylinder that is not round, at a seam along it. */
export interface OvalCylinder {
  /** Greatest less least diameter [mm]. */
  readonly differenceMm: number;
  /** Mean diameter [mm]. */
  readonly diameterMm: number;
  readonly thicknessMm: number;
  /** From the greatest diameter to the seam, φ [°]. */
  readonly angleDeg: number;
  /** Internal pressure, which rounds the cylinder [MPa]. */
  readonly pressureMPa: number;
  readonly youngsModulusMPa: number;
  readonly poissonsRatio: number;
}

/**
 * Magnification of the hoop stress by ovality: km = 1 + 1.5 (Dmax − Dmin) cos 2φ/{t [1 + 0.5 p (1 − ν²)(D/t)³/E]}.
 * @param cylinder diameters and thickness [mm], angle φ [°], pressure and modulus [MPa], Poisson's ratio [-]
 * @returns magnification of the membrane stress at the surface, km; below 1 where it is relieved [-]
 * @validity small ovality of two lobes, p ≥ 0
 * @source BS 7910:2013 Annex D, IIW (from memory)
 * @example ovalityMagnification({ differenceMm: 10, diameterMm: 1000, thicknessMm: 10, angleDeg: 0, pressureMPa: 0, youngsModulusMPa: 207000, poissonsRatio: 0.3 }) // 2.5
 */
export function ovalityMagnification(cylinder: OvalCylinder): number {
  const { differenceMm, diameterMm, thicknessMm, angleDeg, pressureMPa } = cylinder;
  const { youngsModulusMPa, poissonsRatio } = cylinder;
  const slender = (diameterMm / thicknessMm) ** 3;
  const rounding =
    1 + (0.5 * pressureMPa * (1 - poissonsRatio * poissonsRatio) * slender) / youngsModulusMPa;
  const around = Math.cos((angleDeg * Math.PI) / 90);
  return 1 + (1.5 * differenceMm * around) / (thicknessMm * rounding);
}

/**
 * Bending stress misalignment adds to a membrane stress: (Σ(km − 1)) Pm.
 * @param membrane membrane stress, Pm [MPa]
 * @param magnifications magnification km of every kind of misalignment at the joint [-]
 * @returns bending stress, of the class of the membrane stress [MPa]
 * @validity the kinds act at the same surface
 * @source BS 7910:2013 Annex D, IIW (from memory): km = 1 + Σ(km,i − 1)
 * @example misalignmentBending(100, [1.3, 1.2]) // 50
 */
export const misalignmentBending = (membrane: number, magnifications: readonly number[]): number =>
  membrane * magnifications.reduce((sum, km) => sum + (km - 1), 0);
