import type { MPa, Mm } from '../../units/quantity';

/** The depression that is left when a crack is ground out, and its wall. */
export interface Cavity {
  /** Wall before grinding, t [mm]. */
  readonly thickness: Mm;
  /** Depth of the cavity, d [mm]. */
  readonly depth: Mm;
  /** Full extent at the surface in two perpendicular directions [mm]. */
  readonly length: Mm;
  readonly width: Mm;
  /** Smallest radius measured at the bottom; null takes that of the ellipse through depth and extent [mm]. */
  readonly bottomRadius: Mm | null;
}

/**
 * Half the shorter extent: a stress along it meets the steepest sides.
 * @param cavity extents at the surface [mm]
 * @returns half extent along the stress that is worst, b [mm]
 * @validity any
 * @source common practice
 * @example cavityHalfExtent({ thickness: 28, depth: 3, length: 60, width: 24, bottomRadius: null }) // 12
 */
export const cavityHalfExtent = ({ length, width }: Cavity): Mm =>
  (Math.min(length, width) / 2) as Mm;

/**
 * Peak factor at the bottom of a cavity on the stress in the remaining wall: 1 + 2d/b, b half the shorter
 * extent; 1 + 2√(d/ρ) if a sharper bottom radius is measured. An infinitely long groove across the stress:
 * a dish, whose stress also flows round its ends, has less.
 * @param cavity depth, extents and bottom radius [mm]
 * @returns peak stress over the stress in the remaining wall [-]
 * @validity upper estimate in two dimensions for d/b ≤ 1/3; a semicircular groove has 2 % more
 * @source Inglis 1913, half of an elliptical hole; common practice for blended cavities
 * @example cavityPeakFactor({ thickness: 28, depth: 2.5, length: 60, width: 30, bottomRadius: null }) // 1.3333333
 */
export function cavityPeakFactor(cavity: Cavity): number {
  const { depth, bottomRadius } = cavity;
  const ellipse = 1 + (2 * depth) / cavityHalfExtent(cavity);
  return bottomRadius === null
    ? ellipse
    : Math.max(ellipse, 1 + 2 * Math.sqrt(depth / bottomRadius));
}

/**
 * Membrane stress in the wall that remains under the cavity, σm t/(t − d): the ligament as if it carried
 * its share alone.
 * @param cavity wall and depth [mm]
 * @param membrane membrane stress in the full wall [MPa]
 * @returns membrane stress in the remaining wall [MPa]
 * @validity d < t; upper estimate: the wall beside a short cavity takes over part of the load
 * @source equilibrium of the reduced section
 * @example cavityMembrane({ thickness: 28, depth: 3, length: 60, width: 24, bottomRadius: null }, 100) // 112
 */
export const cavityMembrane = ({ thickness, depth }: Cavity, membrane: number): MPa =>
  ((membrane * thickness) / (thickness - depth)) as MPa;

/**
 * Bending stress in the wall that remains, σb t²/(t − d)² for the same moment. With the sides free to turn
 * the membrane force, now off the middle by d/2, adds 3 σm t d/(t − d)².
 * @param cavity wall and depth [mm]
 * @param stress membrane and bending stress in the full wall, bending positive at the cavity's face [MPa]
 * @param free whether the sides are free to turn: a groove along a strip, not a dish in a shell [-]
 * @returns bending stress in the remaining wall, positive at the cavity [MPa]
 * @validity d < t; upper estimates
 * @source equilibrium of the reduced section
 * @example cavityBending({ thickness: 20, depth: 4, length: 60, width: 24, bottomRadius: null }, { membrane: 100, bending: 0 }, true) // 93.75
 */
export function cavityBending(
  { thickness, depth }: Cavity,
  { membrane, bending }: { readonly membrane: number; readonly bending: number },
  free: boolean,
): MPa {
  const left = thickness - depth;
  const moved = free ? 3 * membrane * thickness * depth : 0;
  return ((bending * thickness ** 2 + moved) / left ** 2) as MPa;
}
