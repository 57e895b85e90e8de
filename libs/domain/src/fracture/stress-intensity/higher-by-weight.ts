import type { Crack } from '../../geometry/crack';
import type { Degrees } from '../../units/quantity';
import { deepestPowerFactor, facePowerFactor } from '../weight-function/universal-factors';
import type { HigherInfluence, Influence } from './solution';

/** K per unit of membrane and bending of one family of surface cracks. */
export type SurfaceInfluence = (crack: Crack, angle: Degrees, into: Influence) => void;

const DEEPEST = 90 as Degrees;
const FACE = 0 as Degrees;

const HERE: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
const END: Influence = { membrane: 0, bending: 0, reversedBending: 0 };

/** G1 of a solution in membrane and bending: bending is G0 − 2 (a/t) G1. */
const linearFactor = ({ membrane, bending }: Influence, alpha: number, root: number): number =>
  (membrane - bending) / (2 * alpha * root);

/**
 * K per unit of (x/t)², (x/t)³ and (x/t)⁴ of a semi-elliptical surface crack, from its own uniform and linear
 * coefficients. At the deepest point and at the face by the universal weight function; between them
 * Gn(φ) = G1(φ) [g0 + (g90 − g0) sin^(1 + n/2) φ], g = Gn/G1 of the two ends: continuous, exact at both.
 * @param crack crack and wall [mm]
 * @param angle parametric angle φ, 90 at the deepest point [°]
 * @param into receives K per unit of the higher terms [√mm]
 * @param influence K per unit of membrane and bending of the family [√mm]
 * @returns nothing; the answer stands in `into` [√mm]
 * @validity the limits of the family
 * @source Glinka and Shen 1991 at the ends; own rule between them
 * @example ((k) => (higherByWeight(crackOf({ a: 1, c: 1, t: 2 }), 90, k, (crack, phi, into) => Object.assign(into, { membrane: 1.2, bending: 0.4 })), k.quadratic))({}) // 0.16139835
 */
export function higherByWeight(
  crack: Crack,
  angle: Degrees,
  into: HigherInfluence,
  influence: SurfaceInfluence,
): void {
  const alpha = crack.a / crack.thickness;
  const root = Math.sqrt(Math.PI * crack.a);
  const sine = Math.sin((angle * Math.PI) / 180);
  influence(crack, angle, HERE);
  const linear = linearFactor(HERE, alpha, root);
  influence(crack, DEEPEST, END);
  const deep0 = END.membrane / root;
  const deep1 = linearFactor(END, alpha, root);
  influence(crack, FACE, END);
  const face0 = END.membrane / root;
  const face1 = linearFactor(END, alpha, root);
  const scale = linear * root * alpha * alpha;
  into.quadratic = scale * between(2, sine, deep0, deep1, face0, face1);
  into.cubic = scale * alpha * between(3, sine, deep0, deep1, face0, face1);
  into.quartic = scale * alpha * alpha * between(4, sine, deep0, deep1, face0, face1);
}

/** Gn/G1 at the angle. */
function between(
  degree: 2 | 3 | 4,
  sine: number,
  deep0: number,
  deep1: number,
  face0: number,
  face1: number,
): number {
  const deep = deepestPowerFactor(degree, deep0, deep1) / deep1;
  const face = facePowerFactor(degree, face0, face1) / face1;
  return face + (deep - face) * sine ** (1 + degree / 2);
}
