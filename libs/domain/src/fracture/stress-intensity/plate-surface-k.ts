import type { Crack } from '../../geometry/crack';
import { DEPTH_RATIO, type Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { ASPECT_LIMIT, WIDTH_LIMIT } from './common-limits';
import { higherByWeight } from './higher-by-weight';
import { bendingShare, riseTowardsFace, surfacePolynomial } from './newman-raju-1984';
import { angularFactor, shapeFactor } from './shape-factor';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984), surface crack';

const DEEP =
  'Treat the flaw as through-wall, repair, or ask a specialist for a numerical analysis of this flaw.';

/** Limits of the plate equation; the last two are the range the equations were fitted in. */
export const PLATE_SURFACE_LIMITS: readonly Limit[] = [
  ASPECT_LIMIT,
  {
    name: DEPTH_RATIO,
    text: 'a/t ≤ 0.8',
    min: 0,
    max: 0.8,
    measure: ({ a, thickness }) => a / thickness,
    source: `${SOURCE}: range of the fitted results`,
    input: 'flaw.heightMm',
    instead: DEEP,
  },
  {
    name: '(a/t)/[1.25 (a/c + 0.6)]',
    text: 'a/t ≤ 1.25 (a/c + 0.6) for a flaw longer than a/c = 0.2: ratio ≤ 1',
    min: 0,
    max: 1,
    // as a ratio of the two sides, 0 where the rule does not apply
    measure: ({ a, c, thickness }) => (a / c < 0.2 ? a / thickness / (1.25 * (a / c + 0.6)) : 0),
    source: SOURCE,
    input: 'flaw.heightMm',
    instead: 'Ask a specialist for a long-flaw solution, or size the ends again.',
  },
  WIDTH_LIMIT,
];

/** F of the equation at one point: polynomial, angular amplification, width. */
function tensionFactor({ a, c, thickness, width }: Crack, sine: number): number {
  const depth = a / thickness;
  const fw =
    1 / Math.sqrt(Math.cos(Math.PI * Math.min((c / width) * Math.sqrt(depth), 0.5 - 1e-9)));
  return (
    surfacePolynomial(a, c, depth) *
    riseTowardsFace(a, c, depth, sine) *
    fw *
    angularFactor(a, c, sine)
  );
}

/** First coefficient of the square term of H2 for a surface crack. */
const DEEPEST_BENDING = 0.55;

/**
 * K of a semi-elliptical surface crack in a plate: K = (σm + H σb) √(πa/Q) F, here per unit of stress.
 * @param crack crack and wall: a, c, t, W [mm]
 * @param angle parametric angle φ, 90 at the deepest point [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 0 < a/c ≤ 2, a/t ≤ 0.8, for a/c < 0.2 a/t ≤ 1.25 (a/c + 0.6), 2c/W < 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), surface crack
 * @example at(plateSurfaceInfluence, { a: 2, c: 10, t: 20, W: 100 }, 90).membrane // 2.70094735805
 */
export function plateSurfaceInfluence(crack: Crack, angle: Degrees, into: Influence): void {
  const sine = Math.sin((angle * Math.PI) / 180);
  const root = Math.sqrt((Math.PI * crack.a) / shapeFactor(crack.a, crack.c));
  into.membrane = root * tensionFactor(crack, sine);
  const { a, c, thickness } = crack;
  into.bending = into.membrane * bendingShare(a, c, a / thickness, sine, DEEPEST_BENDING);
  into.reversedBending = -into.bending;
}

export const PLATE_SURFACE_K: StressIntensitySolution = {
  key: 'plate-surface',
  title: 'Semi-elliptical surface flaw in a plate',
  source: SOURCE,
  formula: 'K = (σm + H σb) √(πa/Q) F, F = (M1 + M2 (a/t)² + M3 (a/t)⁴) g fφ fw',
  accuracy:
    'Published ±5 %. Against finite elements: deepest point in tension within 2 % to a/t = 0.4, 3 % at 0.6, 4 to 8 % high at 0.8. Terms (x/t)² to (x/t)⁴ by weight function from its own G0 and G1: deepest point within 3 % at a/c = 0.2, 7 % at 1 and 2; along the front at most 4 % of the uniform coefficient low and 12 % high.',
  limits: PLATE_SURFACE_LIMITS,
  front: 'ellipse',
  influence: plateSurfaceInfluence,
  higher: (crack, angle, into) => higherByWeight(crack, angle, into, plateSurfaceInfluence),
};
