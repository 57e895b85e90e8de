import { complex, multiply, reciprocal, squareRoot } from '../../numerics/complex';
import type { MPa, MPaSqrtMm, Mm } from '../../units/quantity';
import type { StressField } from '../stress-state';

/** A through crack in a wide plate, |x| < a on the x axis, pulled along y and along x. */
export interface PulledCrack {
  /** Half length of the crack, a [mm]. */
  readonly halfLength: Mm;
  /** Stress far away across the crack, S [MPa]. */
  readonly stress: MPa;
  /** Stress far away along the crack over that across it, k [-]. */
  readonly ratio: number;
}

/**
 * Exact stress around a crack in a wide plate under biaxial stress: with Z = S z/√(z² − a²) and
 * Z′ = −S a²/(z² − a²)^1.5, σxx = Re Z − y Im Z′ − (1 − k)S, σyy = Re Z + y Im Z′, τ = −y Re Z′. The root
 * is taken as √(z − a) √(z + a), which is right on both sides of the crack.
 * @param crack half length a, stress S across it, ratio k of the stress along it [MPa]
 * @returns function from a point [mm], origin at the middle of the crack, to its stress [MPa]
 * @validity not at the tips; plate wide against the crack; elastic; S ≥ 0, a closed crack carries pressure
 * @source Westergaard 1939, with the uniform stress along the crack added (Sih 1966, Eftis and Liebowitz 1972, from memory)
 * @example westergaardField({ halfLength: mm(1), stress: mpa(1), ratio: 1 })(1.5, 0, { xx: 0, yy: 0, xy: 0 }).yy // 1.3416407865
 */
export function westergaardField({ halfLength: a, stress, ratio }: PulledCrack): StressField {
  const along = (1 - ratio) * stress;
  const [right, left, half, inverse] = [complex(), complex(), complex(), complex()];
  return (x, y, into) => {
    right.re = x - a;
    left.re = x + a;
    right.im = left.im = y;
    // the product of the two roots, then its inverse and the inverse of its square
    multiply(squareRoot(right, right), squareRoot(left, left), half);
    reciprocal(half, half);
    multiply(half, half, inverse);
    const z = stress * (x * half.re - y * half.im);
    const slope = -stress * a * a;
    const zRe = slope * (half.re * inverse.re - half.im * inverse.im);
    const zIm = slope * (half.re * inverse.im + half.im * inverse.re);
    into.xx = z - y * zIm - along;
    into.yy = z + y * zIm;
    into.xy = -y * zRe;
    return into;
  };
}

/**
 * Stress intensity of the same crack, K = S √(πa); the stress along the crack has no part in it.
 * @param crack half length a and stress S [MPa]
 * @returns mode I stress intensity [MPa·√mm]
 * @validity plate wide against the crack
 * @source Irwin 1957, exact
 * @example pulledCrackK({ halfLength: mm(10), stress: mpa(100), ratio: 0 }) // 560.4991216
 */
export const pulledCrackK = ({ halfLength, stress }: PulledCrack): MPaSqrtMm =>
  (stress * Math.sqrt(Math.PI * halfLength)) as MPaSqrtMm;

/**
 * T-stress of the same crack, (k − 1) S: the uniform stress along the crack beside the singular part.
 * @param crack stress S and ratio k [MPa]
 * @returns T-stress [MPa]
 * @validity plate wide against the crack
 * @source constant term of Westergaard's field, exact
 * @example pulledCrackT({ halfLength: mm(10), stress: mpa(100), ratio: 0 }) // -100
 */
export const pulledCrackT = ({ stress, ratio }: PulledCrack): MPa => ((ratio - 1) * stress) as MPa;

/**
 * Gap between the faces of the same crack, 4 S/E′ √(a² − x²).
 * @param crack half length a and stress S [MPa]
 * @param x distance from the middle of the crack [mm]
 * @param modulus E in plane stress, E/(1 − ν²) in plane strain [MPa]
 * @returns opening of the crack [mm]
 * @validity |x| ≤ a; plate wide against the crack; elastic
 * @source Westergaard 1939, exact
 * @example crackOpening({ halfLength: mm(10), stress: mpa(100), ratio: 0 }, 0, mpa(200000)) // 0.02
 */
export const crackOpening = ({ halfLength, stress }: PulledCrack, x: number, modulus: MPa): Mm =>
  (((4 * stress) / modulus) * Math.sqrt(Math.max(halfLength ** 2 - x * x, 0))) as Mm;
