import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { fittedAspect, fittedDepth, holeRadiusLimit, holeWidthLimit } from './corner-limits';
import { twoCracksFactor } from './hole-crack';
import { holeWidthFactor, oneOfTwo, type CrackedSides } from './hole-parts';
import { riseTowardsFace, surfacePolynomial } from './newman-raju-1984';
import { angularFactor, shapeFactor } from './shape-factor';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984), corner crack at a hole';

/** Effect of the hole and of the two free faces on the crack, g2 g3 g4. */
function holeFactor({ a, c, holeRadius, thickness }: Crack, phi: number): number {
  const depth = a / thickness;
  const l = 1 / (1 + (c / holeRadius) * Math.cos(0.85 * phi));
  const g2 = twoCracksFactor(l) / (1 + 0.13 * l * l);
  const r = a <= c ? a / c : c / a;
  const shape = a <= c ? 1 + 0.04 * r : 1.13 - 0.09 * r;
  const towards = 1 - Math.cos(phi);
  const g3 = shape * (1 + 0.1 * towards * towards) * (0.85 + 0.15 * Math.sqrt(Math.sqrt(depth)));
  const g4 = a <= c ? 1 - 0.7 * (1 - depth) * (r - 0.2) * (1 - r) : 1;
  return g2 * g3 * g4;
}

const cubic = (x: number, s1: number, s2: number, s3: number) => 1 + x * (s1 + x * (s2 + x * s3));

/**
 * Share of the outer-fibre bending stress that acts on a corner crack at a hole, H = H1 + (H2 − H1) sin^p φ.
 * @param a depth along the bore, a [mm]
 * @param c length from the hole, c [mm]
 * @param depth a/t [-]
 * @param sine sin φ [-]
 * @returns share H [-]
 * @validity 0.2 ≤ a/c ≤ 2, a/t < 1
 * @source Newman and Raju, NASA TM-85793 (1984), corner crack at a hole (coefficients from memory; a/c ≤ 1 at φ = 0 agrees with a second evaluation)
 * @example holeBendingShare(3, 4, 0.3, 0) // 0.76656063
 */
export function holeBendingShare(a: number, c: number, depth: number, sine: number): number {
  const long = a <= c;
  const r = long ? a / c : c / a;
  const r2 = r * r;
  const h1 = long
    ? cubic(
        depth,
        -0.43 - 0.74 * r - 0.84 * r2,
        1.25 - 1.19 * r + 4.39 * r2,
        -1.94 + 4.22 * r - 5.51 * r2,
      )
    : cubic(depth, -2.07 + 0.06 * r, 4.35 + 0.16 * r, -2.93 - 0.3 * r);
  const h2 = long
    ? cubic(
        depth,
        -1.5 - 0.04 * r - 1.73 * r2,
        1.71 - 3.17 * r + 6.84 * r2,
        -1.28 + 2.71 * r - 5.22 * r2,
      )
    : cubic(depth, -3.64 + 0.37 * r, 5.87 - 0.49 * r, -4.32 + 0.53 * r);
  const power = long ? 0.1 + 1.3 * depth + 1.1 * r - 0.7 * r * depth : 0.2 + r + 0.6 * depth;
  return h1 + (h2 - h1) * sine ** power;
}

/**
 * K of one or two quarter-elliptical corner cracks at a hole through a plate, per unit of stress.
 * @param crack crack and wall: a along the bore, c from the hole, t, r, W [mm]
 * @param angle parametric angle φ, 90 at the bore [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @param sides cracked sides of the hole [-]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 0.2 ≤ a/c ≤ 2, a/t ≤ 0.8, 0.5 ≤ r/t ≤ 2, 2(r + c)/W ≤ 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), corner crack at a hole
 * @example at(holeCornerInfluence, { a: 2, c: 2, t: 10, r: 5, W: 100 }, 90, 1).membrane // 4.59613196771
 */
export function holeCornerInfluence(
  crack: Crack,
  angle: Degrees,
  into: Influence,
  sides: CrackedSides,
): void {
  const { a, c, thickness } = crack;
  const depth = a / thickness;
  const phi = (angle * Math.PI) / 180;
  const sine = Math.sin(phi);
  const root = Math.sqrt((Math.PI * a) / shapeFactor(a, c)) * angularFactor(a, c, sine);
  const wall = surfacePolynomial(a, c, depth) * riseTowardsFace(a, c, depth, sine);
  const fw = holeWidthFactor(crack, depth, sides);
  const alone = sides === 1 ? oneOfTwo(crack, thickness) : 1;
  into.membrane = root * wall * holeFactor(crack, phi) * fw * alone;
  into.bending = into.membrane * holeBendingShare(a, c, depth, sine);
  into.reversedBending = -into.bending;
}

const holeCornerSolution = (
  key: string,
  title: string,
  sides: CrackedSides,
): StressIntensitySolution => ({
  key,
  title,
  source: SOURCE,
  formula:
    'K = (σm + H σb) √(πa/Q) F, F = (M1 + M2 (a/t)² + M3 (a/t)⁴) g1 g2 g3 g4 fφ fw' +
    (sides === 1 ? ' √[(4/π + ac/(2tr))/(4/π + ac/(tr))]' : ''),
  accuracy: 'Published ±5 % of the finite-element results it was fitted to.',
  limits: [
    fittedAspect(SOURCE),
    fittedDepth(DEPTH_RATIO, 'a/t', SOURCE, 1),
    holeRadiusLimit(SOURCE, 1),
    holeWidthLimit(SOURCE),
  ],
  front: 'ellipse',
  influence: (crack, angle, into) => holeCornerInfluence(crack, angle, into, sides),
  higher: null,
});

export const HOLE_CORNER_ONE_K = holeCornerSolution(
  'hole-corner-one',
  'Corner flaw at one side of a hole',
  1,
);
export const HOLE_CORNER_TWO_K = holeCornerSolution(
  'hole-corner-two',
  'Equal corner flaws at both sides of a hole',
  2,
);
