import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'BS 7910:2013 Annex P.6.2 (from memory; form seen in a secondary source)';

/**
 * Reference stress of a ligament behind a flaw that runs on without end, the wall held against bending:
 * [Pb + √(Pb² + 9 Pm² (1 − α)²)]/[3 (1 − α)²], α the relative depth.
 * @param depth relative depth of the flaw, α = a/t [-]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity α < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.6.2, normal bending restraint (from memory)
 * @example heldLigament(0.4, mpa(100), mpa(0)) // 166.66666667
 */
export function heldLigament(depth: number, membrane: MPa, bending: MPa): MPa {
  const left = 1 - depth;
  if (!(left > 0)) return Number.POSITIVE_INFINITY as MPa;
  const pb = Math.abs(bending);
  return ((pb + Math.hypot(pb, 3 * membrane * left)) / (3 * left * left)) as MPa;
}

/**
 * The same where the wall is free to bend: Pb + 3 Pm α for Pb, exact by the equilibrium of the ligament.
 * @param depth relative depth of the flaw, α [-]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref; Infinity once the ligament is gone [MPa]
 * @validity α < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.6.2, negligible bending restraint (from memory); equilibrium of the ligament
 * @example freeLigament(0.4, mpa(100), mpa(50)) // 386.6558964
 */
export const freeLigament = (depth: number, membrane: MPa, bending: MPa): MPa =>
  heldLigament(depth, membrane, (Math.abs(bending) + 3 * membrane * depth) as MPa);

const depthOf = ({ a, thickness }: Crack): number => a / thickness;

export const EXTENDED_SURFACE_REFERENCE: ReferenceStressSolution = {
  key: 'plate-extended-surface-free',
  title: 'Surface flaw across a plate that is free to bend',
  source: SOURCE,
  formula: 'σref = [b + √(b² + 9 Pm² (1 − α)²)]/[3 (1 − α)²], b = Pb + 3 Pm α, α = a/t',
  basis: 'Equilibrium of the ligament; the force left of it bends the plate.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: (crack, membrane, bending) => freeLigament(depthOf(crack), membrane, bending),
};

export const EXTENDED_SURFACE_HELD_REFERENCE: ReferenceStressSolution = {
  key: 'plate-extended-surface-held',
  title: 'Very long surface flaw in a wall that is held against bending',
  source: SOURCE,
  formula: 'σref = [Pb + √(Pb² + 9 Pm² (1 − α)²)]/[3 (1 − α)²], α = a/t',
  basis: 'Collapse of the ligament; the wall beside it takes the moment of the shifted force.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: (crack, membrane, bending) => heldLigament(depthOf(crack), membrane, bending),
};

/** A crack through the free edge of a plate: its depth counts across the width, bending is in the plane. */
export const PLATE_EDGE_REFERENCE: ReferenceStressSolution = {
  key: 'plate-edge',
  title: 'Crack through the edge of a plate',
  source: SOURCE,
  formula: 'σref = [b + √(b² + 9 Pm² (1 − α)²)]/[3 (1 − α)²], b = Pb + 3 Pm α, α = a/W',
  basis: 'Equilibrium of the ligament across the width, the plate free to bend in its plane.',
  scope: 'global',
  vanishing: 'exact',
  limits: [],
  stress: ({ a, width }, membrane, bending) => freeLigament(a / width, membrane, bending),
};
