import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'equilibrium of the net section';
/** Plastic over elastic section modulus of a round bar, 16/(3π). */
const SHAPE = 16 / (3 * Math.PI);

/**
 * Reference stress of a round bar of which a share of area and of plastic modulus is left:
 * Pm/A + Pb/(16/(3π) Z), force and moment added, the cautious side of their interaction.
 * @param area share of the area left, A [-]
 * @param modulus share of the plastic modulus left, Z [-]
 * @param membrane primary tension, Pm [MPa]
 * @param bending primary bending of the bar at its surface, Pb [MPa]
 * @returns reference stress, σref; Infinity once nothing is left [MPa]
 * @validity A, Z > 0; Pm ≥ 0, Pb taken without its sign
 * @source equilibrium; plastic modulus of a circle 4 r³/3
 * @example netBar(0.25, 0.125, mpa(100), mpa(0)) // 400
 */
export function netBar(area: number, modulus: number, membrane: MPa, bending: MPa): MPa {
  if (!(area > 0 && modulus > 0)) return Number.POSITIVE_INFINITY as MPa;
  return (membrane / area + Math.abs(bending) / (SHAPE * modulus)) as MPa;
}

const radiusOf = ({ thickness }: Crack): number => thickness / 2;

export const BAR_RING_REFERENCE: ReferenceStressSolution = {
  key: 'bar-ring',
  title: 'Crack around a round bar',
  source: SOURCE,
  formula: 'σref = Pm/ξ² + 3π Pb/(16 ξ³), ξ = 1 − a/b, b = t/2',
  basis:
    'Collapse of the round ligament; the constraint of the notch, which would raise it, is left out.',
  scope: 'global',
  vanishing: 'exact',
  limits: [],
  stress: (crack, membrane, bending) => {
    const left = Math.max(1 - crack.a / radiusOf(crack), 0);
    return netBar(left ** 2, left ** 3, membrane, bending);
  },
};

export const BAR_PENNY_REFERENCE: ReferenceStressSolution = {
  key: 'bar-penny',
  title: 'Round flaw on the axis of a round bar',
  source: SOURCE,
  formula: 'σref = Pm/(1 − (a/b)²) + 3π Pb/[16 (1 − (a/b)³)], b = t/2',
  basis: 'Collapse of the ring around the flaw.',
  scope: 'global',
  vanishing: 'exact',
  limits: [],
  stress: (crack, membrane, bending) => {
    const taken = crack.a / radiusOf(crack);
    return netBar(1 - taken ** 2, 1 - taken ** 3, membrane, bending);
  },
};
