import { mm } from '../../units/quantity';
import type { CavityBlock, CavityInput } from './cavity-input';
import { cavityBending, cavityMembrane, cavityPeakFactor, type Cavity } from './cavity-stress';
import { cyclesEndured, thicknessFactor, type SnClass } from './sn-curve';

/** Miner sum a load that varies is allowed, after the IIW recommendations (from memory). */
export const DAMAGE_LIMIT = 0.5;

/** The cavity of an input, in the symbols of the formulas. */
export const cavityOf = (input: CavityInput): Cavity => ({
  thickness: mm(input.thicknessMm),
  depth: mm(input.depthMm),
  length: mm(input.lengthMm),
  width: mm(input.widthMm),
  bottomRadius: input.bottomRadiusMm === null ? null : mm(input.bottomRadiusMm),
});

/** Stress range at the bottom of the cavity, peak factor included [MPa]. */
export function peakRange(input: CavityInput, block: CavityBlock): number {
  const cavity = cavityOf(input);
  const stress = { membrane: block.membraneRangeMPa, bending: block.bendingRangeMPa };
  const bending = cavityBending(cavity, stress, input.sides === 'free');
  return cavityPeakFactor(cavity) * (cavityMembrane(cavity, stress.membrane) + bending);
}

/** Share of the life of the ground surface that one year uses up, by Miner's sum over the blocks. */
export function damagePerYear(
  input: CavityInput,
  surface: SnClass,
  blocks: readonly CavityBlock[],
): number {
  const factor = thicknessFactor(input.thicknessMm);
  const curve = { ...surface, rangeMPa: surface.rangeMPa * factor };
  return blocks.reduce((sum, block) => {
    const range = peakRange(input, block);
    return range > 0 ? sum + block.cyclesPerYear / cyclesEndured(range, curve) : sum;
  }, 0);
}
