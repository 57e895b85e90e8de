import { mpaSqrtMm, type Mm } from '../../units/quantity';
import { nearTipField } from './near-tip-field';
import {
  pulledCrackK,
  pulledCrackT,
  westergaardField,
  type PulledCrack,
} from './westergaard-field';

/**
 * Near-tip over exact stress on the line ahead of a crack in a wide plate, √(1 + ρ/2)/(1 + ρ), ρ = r/a.
 * @param relative distance from the tip over half length, ρ = r/a [-]
 * @returns share of the exact σyy that the near-tip field gives [-]
 * @validity ρ ≥ 0; plate wide against the crack
 * @source Irwin's field over Westergaard's, exact
 * @example nearTipShareAhead(0.1) // 0.9315409787
 */
export const nearTipShareAhead = (relative: number): number =>
  Math.sqrt(1 + relative / 2) / (1 + relative);

/**
 * Distance ahead of the tip within which the near-tip field is short of the exact one by at most an error:
 * the root of ρ² + (2 − e/2)ρ + 1 − e = 0, e = (1 + δ)², δ the excess of the exact stress.
 * @param halfLength half length of the crack, a [mm]
 * @param excess exact over near-tip stress less one, δ [-]
 * @returns distance from the tip [mm]
 * @validity δ ≥ 0; plate wide against the crack
 * @source algebra of the exact ratio (1 + ρ)/√(1 + ρ/2)
 * @example nearTipReach(mm(10), 0.05) // 0.6759667918
 */
export function nearTipReach(halfLength: Mm, excess: number): Mm {
  const e = (1 + excess) ** 2;
  const linear = 2 - e / 2;
  // 2c/(b + √…) keeps its digits where e is close to 1
  const root = (2 * (e - 1)) / (linear + Math.sqrt(linear * linear + 4 * (e - 1)));
  return (halfLength * root) as Mm;
}

/**
 * Near-tip over exact stress σyy at any point beside the right tip.
 * @param crack half length a, stress S across it, ratio k of the stress along it [MPa]
 * @returns function from a point [mm], origin at the tip, to the ratio [-]; not finite where the exact stress is zero
 * @validity not at a tip, not on a face; plate wide against the crack
 * @source Irwin's field over Westergaard's
 * @example nearTipShare({ halfLength: mm(10), stress: mpa(100), ratio: 1 })(1, 0) // 0.9315409787
 */
export function nearTipShare(crack: PulledCrack): (x: number, y: number) => number {
  const exact = westergaardField(crack);
  const [opening, along] = [pulledCrackK(crack), pulledCrackT(crack)];
  const near = nearTipField({ opening, sliding: mpaSqrtMm(0), along });
  const state = { xx: 0, yy: 0, xy: 0 };
  return (x, y) => near(x, y, state).yy / exact(x + crack.halfLength, y, state).yy;
}
