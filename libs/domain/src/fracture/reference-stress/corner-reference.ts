import type { Crack } from '../../geometry/crack';
import type { MPa } from '../../units/quantity';
import { heldLigament } from './extended-surface-reference';
import type { ReferenceStressSolution } from './solution';

const SOURCE = 'BS 7910:2013 Annex P.7.1 (from memory; form seen in a secondary source)';

/**
 * Share of the section a corner flaw takes out, spread over the wall beside it: α″ = (a/B)/(1 + 2B/c), or
 * (a/B)(c/W) in a plate narrower than c + 2B.
 * @param crack crack and wall: a, c, t, W [mm]
 * @returns area ratio α″ [-]
 * @validity a < B, c < W
 * @source BS 7910:2013 Annex P.7.1 (from memory; form seen in a secondary source)
 * @example cornerAreaRatio(crackOf({ a: 5, c: 15, t: 20, W: 500 })) // 0.0681818182
 */
export const cornerAreaRatio = ({ a, c, thickness, width }: Crack): number =>
  width >= c + 2 * thickness
    ? a / thickness / (1 + (2 * thickness) / c)
    : (a / thickness) * (c / width);

/**
 * Reference stress of a quarter-elliptical corner flaw, wall held against bending:
 * [Pb + √(Pb² + 9 Pm² (1 − α″)²)]/[3 (1 − α″)²].
 * @param crack crack and wall: a, c, t, W [mm]
 * @param membrane primary membrane stress, Pm [MPa]
 * @param bending primary bending stress, Pb [MPa]
 * @returns reference stress, σref [MPa]
 * @validity α″ < 1; Pm ≥ 0, Pb taken without its sign
 * @source BS 7910:2013 Annex P.7.1 (from memory; form seen in a secondary source)
 * @example cornerReference(crackOf({ a: 5, c: 15, t: 20, W: 500 }), mpa(100), mpa(0)) // 107.3170731707
 */
export const cornerReference = (crack: Crack, membrane: MPa, bending: MPa): MPa =>
  heldLigament(cornerAreaRatio(crack), membrane, bending);

export const PLATE_CORNER_REFERENCE: ReferenceStressSolution = {
  key: 'plate-corner',
  title: 'Corner flaw in a plate',
  source: SOURCE,
  formula: 'σref = [Pb + √(Pb² + 9 Pm² (1 − α″)²)]/[3 (1 − α″)²], α″ = (a/t)/(1 + 2t/c)',
  basis: 'Local collapse at the corner; the wall beside it holds it against bending.',
  scope: 'local',
  vanishing: 'exact',
  limits: [],
  stress: cornerReference,
};

export const NOZZLE_CORNER_REFERENCE: ReferenceStressSolution = {
  ...PLATE_CORNER_REFERENCE,
  key: 'nozzle-corner',
  title: 'Corner flaw at a nozzle, as at a plate’s corner',
  source: `${SOURCE}; its use at a nozzle: common practice`,
  basis:
    'Local collapse at the corner by membrane and bending across it, peak of the nozzle included: an upper estimate, as the peak itself does not lead to collapse.',
};
