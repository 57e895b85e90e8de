import type { Degrees, MPa, MPaSqrtMm, Mm } from '../../units/quantity';
import type { PlaneCondition, PlaneStress, StressField } from '../stress-state';

/** What rules the stress near a tip: the intensities in the plane and the uniform stress along the crack. */
export interface TipLoad {
  /** Opening mode, KI [MPa·√mm]. */
  readonly opening: MPaSqrtMm;
  /** Sliding mode, KII [MPa·√mm]. */
  readonly sliding: MPaSqrtMm;
  /** T-stress [MPa]. */
  readonly along: MPa;
}

/**
 * Stress near a crack tip, the first two terms of the series: KI/√(2πr) and KII/√(2πr) with their
 * functions of the angle, and the T-stress. The tip is the origin, the crack lies along −x.
 * @param load KI, KII [MPa·√mm] and T [MPa]
 * @returns function from a point [mm] to its stress [MPa]
 * @validity r above 0 and small against crack and ligament; elastic
 * @source Irwin 1957, Williams 1957
 * @example nearTipField({ opening: mpaSqrtMm(1), sliding: mpaSqrtMm(0), along: mpa(0) })(0.005, 0.00866025403784, { xx: 0, yy: 0, xy: 0 }).yy // 5.18241224207
 */
export function nearTipField({ opening, sliding, along }: TipLoad): StressField {
  const scale = 1 / Math.sqrt(2 * Math.PI);
  return (x, y, into) => {
    const r = Math.sqrt(x * x + y * y);
    // the half angle without a call, the smaller part from the larger: cos θ/2 ≥ 0, sin θ/2 as y
    const larger = Math.sqrt((r + Math.abs(x)) / (2 * r));
    const smaller = Math.abs(y) / (2 * r * larger);
    const c = x < 0 ? smaller : larger;
    const s = (x < 0 ? larger : smaller) * (y < 0 ? -1 : 1);
    const c3 = c * (4 * c * c - 3);
    const s3 = s * (3 - 4 * s * s);
    const k1 = (opening * scale) / Math.sqrt(r);
    const k2 = (sliding * scale) / Math.sqrt(r);
    into.xx = k1 * c * (1 - s * s3) - k2 * s * (2 + c * c3) + along;
    into.yy = k1 * c * (1 + s * s3) + k2 * s * c * c3;
    into.xy = k1 * s * c * c3 + k2 * c * (1 - s * s3);
    return into;
  };
}

/**
 * Stress near the tip at a distance and angle.
 * @param load KI, KII [MPa·√mm] and T [MPa]
 * @param r distance from the tip [mm]
 * @param theta angle from the line ahead [°]
 * @returns stress at the point [MPa]
 * @validity r above 0 and small against crack and ligament; −180° to 180°
 * @source Irwin 1957, Williams 1957
 * @example nearTipStress({ opening: mpaSqrtMm(1), sliding: mpaSqrtMm(0), along: mpa(0) }, mm(0.01), degrees(120)).yy // 1.99471140201
 */
export function nearTipStress(load: TipLoad, r: Mm, theta: Degrees): PlaneStress {
  const angle = (theta * Math.PI) / 180;
  const into = { xx: 0, yy: 0, xy: 0 };
  return nearTipField(load)(r * Math.cos(angle), r * Math.sin(angle), into);
}

/**
 * Gap between the faces of a crack behind its tip, 8 KI/E′ √(r/2π).
 * @param opening KI [MPa·√mm]
 * @param r distance behind the tip [mm]
 * @param modulus E in plane stress, E/(1 − ν²) in plane strain, E′ [MPa]
 * @returns opening at r [mm]
 * @validity r small against the crack; elastic
 * @source Irwin 1957
 * @example nearTipOpening(mpaSqrtMm(1000), mm(1), mpa(200000)) // 0.0159576912
 */
export const nearTipOpening = (opening: MPaSqrtMm, r: Mm, modulus: MPa): Mm =>
  (((8 * opening) / modulus) * Math.sqrt(r / (2 * Math.PI))) as Mm;

/**
 * Distance from a tip at which the von Mises stress of the opening mode reaches yield, at an angle:
 * (K/σy)²/(4π) [f²(1 + cos θ) + 3/2 sin²θ], f = 1 in plane stress and 1 − 2ν in plane strain.
 * @param opening KI [MPa·√mm]
 * @param yieldStrength σy [MPa]
 * @param theta angle from the line ahead [°]
 * @param condition plane stress or plane strain [-]
 * @param poisson Poisson's ratio, ν; counts in plane strain only [-]
 * @returns edge of the yielded zone, first order [mm]
 * @validity zone small against crack, ligament and thickness; no hardening, no redistribution
 * @source von Mises' condition on Irwin's field; McClintock and Irwin 1965 (from memory)
 * @example yieldedEdge(mpaSqrtMm(400), mpa(400), degrees(0), 'plane stress', 0.3) // 0.1591549431
 */
export function yieldedEdge(
  opening: MPaSqrtMm,
  yieldStrength: MPa,
  theta: Degrees,
  condition: PlaneCondition,
  poisson: number,
): Mm {
  const angle = (theta * Math.PI) / 180;
  const held = condition === 'plane strain' ? (1 - 2 * poisson) ** 2 : 1;
  const shape = held * (1 + Math.cos(angle)) + 1.5 * Math.sin(angle) ** 2;
  return (((opening / yieldStrength) ** 2 / (4 * Math.PI)) * shape) as Mm;
}
