import { centreToNearerFace, type Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { Degrees } from '../../units/quantity';
import { ASPECT_LIMIT, WIDTH_LIMIT } from './common-limits';
import { angularFactor, shapeFactor } from './shape-factor';
import type { Influence, StressIntensitySolution } from './solution';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984), embedded crack';

const DEEP =
  'Treat the flaw as surface-breaking, repair, or ask a specialist for a numerical analysis of this flaw.';

/** Limits of the embedded equation, with the distance to the nearer face as its half thickness. */
export const PLATE_EMBEDDED_LIMITS: readonly Limit[] = [
  ASPECT_LIMIT,
  {
    name: 'a/(a + p)',
    text: 'a/(a + p) ≤ 0.8, p the smaller ligament',
    min: 0,
    max: 0.8,
    measure: (crack) => crack.a / centreToNearerFace(crack),
    source: `${SOURCE}: range of the fitted results`,
    input: 'flaw.heightMm',
    instead: DEEP,
  },
  WIDTH_LIMIT,
];

/**
 * Boundary correction of an embedded elliptical crack at mid-thickness of a plate 2t thick.
 * @param a half height, a [mm]
 * @param c half length, c [mm]
 * @param half half the plate thickness, t [mm]
 * @param sine sin φ [-]
 * @returns factor F in K = σ √(πa/Q) F, without the width term [-]
 * @validity a/t < 1, fitted to 0.8; 0 < a/c ≤ 2
 * @source Newman and Raju, NASA TM-85793 (1984), embedded crack
 * @example embeddedFactor(mm(1), mm(1), mm(1e6), 1) // 1
 */
export function embeddedFactor(a: number, c: number, half: number, sine: number): number {
  const depth = Math.min(a / half, 1);
  const aspect = (a / c) ** 1.5;
  const m1 = a <= c ? 1 : Math.sqrt(c / a);
  const m2 = 0.05 / (0.11 + aspect);
  const m3 = 0.29 / (0.23 + aspect);
  const cosine = Math.sqrt(Math.max(1 - sine * sine, 0));
  const g = 1 - ((depth ** 4 * Math.sqrt(2.6 - 2 * depth)) / (1 + (4 * a) / c)) * cosine;
  return (m1 + (m2 + m3 * depth * depth) * depth * depth) * g;
}

/**
 * K of an embedded elliptical crack anywhere in the wall, per unit of stress, from the mid-thickness
 * equation with the distance from the centre to the nearer face as half thickness. In two dimensions this
 * is never below the eccentric solution. A stress that varies over the crack is taken at its highest there.
 * @param crack crack and wall: a, c, p, t, W [mm]
 * @param angle parametric angle φ, 90 at the tip nearer the face [°]
 * @param into receives K per unit of membrane and bending stress [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity 0 < a/c ≤ 2, a/(a + p) ≤ 0.8, 2c/W < 0.5
 * @source Newman and Raju, NASA TM-85793 (1984), embedded crack; its use off the centre is our own, on the conservative side
 * @example at(plateEmbeddedInfluence, { a: 2, c: 4, p: 8, t: 20 }, 90).membrane // 2.08048186069
 */
export function plateEmbeddedInfluence(crack: Crack, angle: Degrees, into: Influence): void {
  const { a, c, ligament, thickness, width } = crack;
  const sine = Math.abs(Math.sin((angle * Math.PI) / 180));
  const half = centreToNearerFace(crack);
  const root = Math.sqrt((Math.PI * a) / shapeFactor(a, c));
  const across = (c / width) * Math.sqrt(Math.min(a / half, 1));
  const fw = 1 / Math.sqrt(Math.cos(Math.PI * Math.min(across, 0.5 - 1e-9)));
  const near = 1 - (2 * ligament) / thickness;
  const far = 1 - (2 * (ligament + 2 * a)) / thickness;
  into.membrane = root * embeddedFactor(a, c, half, sine) * fw * angularFactor(a, c, sine);
  into.bending = into.membrane * Math.max(near, far);
  into.reversedBending = into.membrane * Math.max(-near, -far);
}

export const PLATE_EMBEDDED_K: StressIntensitySolution = {
  key: 'plate-embedded',
  title: 'Embedded elliptical flaw in a plate',
  source: SOURCE,
  formula:
    'K = σ √(πa/Q) (M1 + M2 (a/t′)² + M3 (a/t′)⁴) g fφ fw, t′ = a + p, σ the highest over the flaw',
  accuracy:
    'At mid-thickness within 2 % of finite elements to a/t = 0.4, 5 % at 0.8. Off the centre the symmetric form at the nearer face is an upper estimate.',
  limits: PLATE_EMBEDDED_LIMITS,
  front: 'ellipse',
  influence: plateEmbeddedInfluence,
  higher: null,
};
