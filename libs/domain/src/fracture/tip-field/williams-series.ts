import type { PlaneStress } from '../stress-state';
import type { PulledCrack } from './westergaard-field';

/**
 * Stress of one term of the series around a crack tip, opening mode, per unit of its coefficient:
 * with p = n/2, σxx = p r^(p−1) {[2 + p + (−1)ⁿ] cos(p − 1)θ − (p − 1) cos(p − 3)θ} and its companions.
 * The first coefficient is KI/√(2π), the second T/4.
 * @param n number of the term, 1, 2, 3 … [-]
 * @param r distance from the tip [mm]
 * @param theta angle from the line ahead [rad]
 * @returns stress per unit of the coefficient [MPa]
 * @validity r > 0; −π ≤ θ ≤ π; faces free of traction
 * @source Williams 1957
 * @example openingTerm(2, 5, 1).xx // 4
 */
export function openingTerm(n: number, r: number, theta: number): PlaneStress {
  const p = n / 2;
  const even = n % 2 === 0 ? 1 : -1;
  const scale = p * r ** (p - 1);
  const [c1, s1] = [Math.cos((p - 1) * theta), Math.sin((p - 1) * theta)];
  const [c3, s3] = [Math.cos((p - 3) * theta), Math.sin((p - 3) * theta)];
  return {
    xx: scale * ((2 + p + even) * c1 - (p - 1) * c3),
    yy: scale * ((2 - p - even) * c1 + (p - 1) * c3),
    xy: scale * ((p - 1) * s3 - (p + even) * s1),
  };
}

/**
 * Stress of one term of the sliding mode, per unit of its coefficient:
 * σxx = −p r^(p−1) {[2 + p − (−1)ⁿ] sin(p − 1)θ − (p − 1) sin(p − 3)θ}. The first is −KII/√(2π).
 * @param n number of the term, 1, 2, 3 … [-]
 * @param r distance from the tip [mm]
 * @param theta angle from the line ahead [rad]
 * @returns stress per unit of the coefficient [MPa]
 * @validity r > 0; −π ≤ θ ≤ π; faces free of traction
 * @source Williams 1957
 * @example slidingTerm(1, 1, 0).xy // -1
 */
export function slidingTerm(n: number, r: number, theta: number): PlaneStress {
  const p = n / 2;
  const even = n % 2 === 0 ? 1 : -1;
  const scale = p * r ** (p - 1);
  const [c1, s1] = [Math.cos((p - 1) * theta), Math.sin((p - 1) * theta)];
  const [c3, s3] = [Math.cos((p - 3) * theta), Math.sin((p - 3) * theta)];
  return {
    xx: -scale * ((2 + p - even) * s1 - (p - 1) * s3),
    yy: -scale * ((2 - p + even) * s1 + (p - 1) * s3),
    xy: scale * ((p - 1) * c3 - (p - even) * c1),
  };
}

/**
 * Coefficient of one term of the opening mode for a crack in a wide plate, from the expansion of the exact
 * stress ahead, S (1 + ρ)/√(2ρ + ρ²): terms of even number vanish beyond the T-stress.
 * @param crack half length a, stress S across it, ratio k of the stress along it [MPa]
 * @param n number of the term, 1, 2, 3 … [-]
 * @returns coefficient of the nth term [MPa·mm^(1 − n/2)]
 * @validity plate wide against the crack; the series converges for r < 2a
 * @source Taylor series of Westergaard's stress ahead of the tip, exact
 * @example openingCoefficient({ halfLength: mm(2), stress: mpa(1), ratio: 0 }, 1) // 1
 */
export function openingCoefficient({ halfLength, stress, ratio }: PulledCrack, n: number): number {
  if (n === 2) return ((ratio - 1) * stress) / 4;
  if (n % 2 === 0) return 0;
  const j = (n - 1) / 2;
  const series = halfBinomial(j) + (j > 0 ? halfBinomial(j - 1) : 0);
  return ((stress * Math.sqrt(halfLength / 2)) / halfLength ** j / n) * series;
}

/** Coefficient of ρʲ in (1 + ρ/2)^−½. */
function halfBinomial(j: number): number {
  let value = 1;
  for (let i = 1; i <= j; i++) value *= -(2 * i - 1) / (4 * i);
  return value;
}
