import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import { fittedAspect, fittedDepth, holeRadiusLimit, holeWidthLimit } from './corner-limits';
import { twoCracksFactor } from './hole-crack';
import { holeWidthFactor, oneOfTwo, type CrackedSides } from './hole-parts';
import { embeddedFactor } from './plate-embedded-k';
import { angularFactor, shapeFactor } from './shape-factor';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984), surface crack at a hole';

/** Effect of the hole on the crack and of the faces of the plate on its ends, g2 g3. */
function holeFactor({ c, holeRadius }: Crack, depth: number, phi: number): number {
  const l = 1 / (1 + (c / holeRadius) * Math.cos(0.9 * phi));
  const g2 = twoCracksFactor(l) / (1 + 0.08 * l * l);
  const towards = 1 - Math.cos(phi);
  return g2 * (1 + 0.1 * towards * towards * Math.max(1 - depth, 0) ** 10);
}

/**
 * K of one or two semi-elliptical cracks in the bore of a hole, at mid-thickness, per unit of stress. Bending of
 * the plate is taken at its highest over the crack.
 * @param crack crack and wall: a half height along the bore, c from the hole, full thickness, r, W [mm]
 * @param angle parametric angle φ, 90 at the bore [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @param sides cracked sides of the hole [-]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 0.2 ≤ a/c ≤ 2, 2a/t ≤ 0.8, 0.5 ≤ 2r/t ≤ 2, 2(r + c)/W ≤ 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), surface crack at a hole
 * @example at(holeSurfaceInfluence, { a: 2, c: 2, t: 20, r: 5, W: 100 }, 0, 2).membrane // 3.05212023828
 */
export function holeSurfaceInfluence(
  crack: Crack,
  angle: Degrees,
  into: Influence,
  sides: CrackedSides,
): void {
  const { a, c, thickness } = crack;
  const half = thickness / 2;
  const depth = a / half;
  const phi = (angle * Math.PI) / 180;
  const sine = Math.sin(phi);
  const root = Math.sqrt((Math.PI * a) / shapeFactor(a, c)) * angularFactor(a, c, sine);
  const fw = holeWidthFactor(crack, depth, sides);
  const alone = sides === 1 ? oneOfTwo(crack, half) : 1;
  const wall = embeddedFactor(a, c, half, sine) * holeFactor(crack, depth, phi);
  into.membrane = root * wall * fw * alone;
  into.bending = into.membrane * Math.min(depth, 1);
  into.reversedBending = into.bending;
}

const holeSurfaceSolution = (
  key: string,
  title: string,
  sides: CrackedSides,
): StressIntensitySolution => ({
  key,
  title,
  source: SOURCE,
  formula:
    'K = σ √(πa/Q) F, F = (M1 + M2 (2a/t)² + M3 (2a/t)⁴) g1 g2 g3 fφ fw' +
    (sides === 1 ? ' √[(4/π + ac/(tr))/(4/π + 2ac/(tr))]' : '') +
    ', σ the highest over the flaw',
  accuracy: 'Published ±5 % of the finite-element results it was fitted to, in tension.',
  limits: [
    fittedAspect(SOURCE),
    fittedDepth('2a/t', '2a/t', SOURCE, 0.5),
    holeRadiusLimit(SOURCE, 0.5),
    holeWidthLimit(SOURCE),
  ],
  front: 'ellipse',
  influence: (crack, angle, into) => holeSurfaceInfluence(crack, angle, into, sides),
  higher: null,
});

export const HOLE_SURFACE_ONE_K = holeSurfaceSolution(
  'hole-surface-one',
  'Flaw in the bore of a hole, one side, at mid-thickness',
  1,
);
export const HOLE_SURFACE_TWO_K = holeSurfaceSolution(
  'hole-surface-two',
  'Equal flaws in the bore of a hole, both sides, at mid-thickness',
  2,
);
