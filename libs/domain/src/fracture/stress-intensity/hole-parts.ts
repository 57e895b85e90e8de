import type { Crack } from '../../geometry/crack';

/** Sides of the hole that are cracked. */
export type CrackedSides = 1 | 2;

/**
 * Finite width of a plate with a cracked hole: √[sec(πr/W) sec(π(2r + nc)/(2W − 4c + 2nc) √(a/t))].
 * @param crack crack and wall: c, r, W [mm]
 * @param depth a/t, 1 for a crack through the plate [-]
 * @param sides cracked sides of the hole, n [-]
 * @returns factor fw [-]
 * @validity 2(r + c)/W < 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), cracks at a hole
 * @example holeWidthFactor(crackOf({ a: 2, c: 2, t: 10, r: 5, W: 100 }), 0.2, 1) // 1.00807856
 */
export function holeWidthFactor(
  { c, holeRadius, width }: Crack,
  depth: number,
  sides: CrackedSides,
): number {
  const rest = 2 * width - 4 * c + 2 * sides * c;
  const across = rest > 0 ? Math.min((2 * holeRadius + sides * c) / rest, 0.5) : 0.5;
  return secantRoot(holeRadius / width) * secantRoot(across * Math.sqrt(depth));
}

// √sec(πx), held short of its pole for searches that step there
const secantRoot = (x: number) => 1 / Math.sqrt(Math.cos(Math.PI * Math.min(x, 0.499999)));

/**
 * What one crack at a hole has of two equal ones: √[(4/π + ac/(2tr))/(4/π + ac/(tr))].
 * @param crack crack and wall: a, c, r [mm]
 * @param half thickness that holds the crack, t [mm]
 * @returns ratio of K [-]
 * @validity as the equations for two cracks
 * @source Shah 1976, as used in NASA TM-85793 (1984)
 * @example oneOfTwo(crackOf({ a: 2, c: 2, t: 10, r: 5 }), 10) // 0.98510979
 */
export function oneOfTwo({ a, c, holeRadius }: Crack, half: number): number {
  const area = (a * c) / (half * holeRadius);
  return Math.sqrt((4 / Math.PI + area / 2) / (4 / Math.PI + area));
}
