import { wallAfter, type Thinning } from '../growth/with-time/thinning';
import type { Mm } from '../units/quantity';

/** A wall over the years. */
export interface WallInTime {
  readonly thickness: (years: number) => Mm;
  /** Factor on the stress of the same load. */
  readonly rise: (years: number) => number;
  /** What the face the flaw is measured from has lost [mm]. */
  readonly lostAtFace: (years: number) => number;
}

// a wall that is gone has no solution: its limits have long ended the growth
const LEAST_SHARE = 1e-3;

/**
 * The wall of a section as it corrodes. Membrane stress rises as B0/B, bending as its square; a stress with
 * both is taken to rise as the square, the cautious side.
 */
export function thinningWall(wall: Mm, thinning: Thinning | null, bent: boolean): WallInTime {
  if (!thinning || thinning.rateMmPerYear === 0) {
    return { thickness: () => wall, rise: () => 1, lostAtFace: () => 0 };
  }
  const { rateMmPerYear, face } = thinning;
  const thickness = (years: number) =>
    Math.max(wallAfter(wall, rateMmPerYear, years), LEAST_SHARE * wall) as Mm;
  return {
    thickness,
    rise: (years) => (wall / thickness(years)) ** (bent ? 2 : 1),
    lostAtFace: (years) => (face === 'cracked' ? wall - thickness(years) : 0),
  };
}
