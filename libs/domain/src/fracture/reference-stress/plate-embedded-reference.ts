import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

/**
 * Reference stress of an embedded flaw: b = Pb + 3 Pm α″, D = (1 − α″)² + 4 p α″/B,
 * σref = [b + √(b² + 9 Pm² D)]/(3 D), α″ = (2a/B)/(1 + B/c) or (4a/B)(c/W) in a narrow plate.
 * @param crack crack and wall: a, c, p, t, W [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity 2a + p < B; p the smaller ligament; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2005 P.3.4, 2013 P.6 (from memory)
 * @example plateEmbeddedReference(crackOf({ a: 3, c: 10, p: 4, t: 25, W: 500 }), mpa(120), mpa(40)) // 151.5581131
 */
export function plateEmbeddedReference(crack: Crack, membrane: MPa, bending: MPa): MPa {
  const { a, c, thickness, width } = crack;
  const ligament = Math.max(Math.min(crack.ligament, thickness - 2 * a - crack.ligament), 0);
  const taken =
    width >= 2 * (c + thickness)
      ? (2 * a) / thickness / (1 + thickness / c)
      : ((4 * a) / thickness) * (c / width);
  if (!(taken < 1)) return Number.POSITIVE_INFINITY as MPa;
  const d = (1 - taken) ** 2 + (4 * ligament * taken) / thickness;
  const b = Math.abs(bending) + 3 * membrane * taken;
  return ((b + Math.sqrt(b * b + 9 * membrane * membrane * d)) / (3 * d)) as MPa;
}

export const PLATE_EMBEDDED_REFERENCE: ReferenceStressSolution = {
  key: 'plate-embedded',
  title: 'Embedded flaw in a wall',
  source: 'BS 7910 Annex P, embedded flaw (from memory)',
  formula: 'σref = [b + √(b² + 9 Pm² D)]/(3 D), b = Pb + 3 Pm α″, D = (1 − α″)² + 4 p α″/t',
  basis: 'Equilibrium of the two ligaments, flaw spread over the wall beside it.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: plateEmbeddedReference,
};
