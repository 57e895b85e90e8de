import type { GrowthLaw } from '../growth-law';
import type { RangeCount } from '../spectrum/equivalent-range';
import { cyclesThroughStages, growsFrom, sizeThroughStages } from './stage-life';

/** Programmes run through until a size, and where in the last one. */
export interface CountedProgrammes {
  readonly status: 'reached' | 'no growth' | 'programme limit';
  /** Whole programmes done before the one in which the size is reached. */
  readonly programmes: number;
  /** Block of the last programme, from 0, and cycles of it done. */
  readonly block: number;
  readonly cyclesOfBlock: number;
  readonly sizeMm: number;
}

/**
 * Runs a flaw through a programme of blocks, again and again and in the order given, at constant shape
 * factor: each block by the closed form of the law's stages and by its own threshold.
 */
export function blockByBlock(
  law: GrowthLaw,
  shapeFactor: number,
  programme: readonly RangeCount[],
  { fromMm, toMm }: { readonly fromMm: number; readonly toMm: number },
  { maxProgrammes = 1e6 }: { readonly maxProgrammes?: number } = {},
): CountedProgrammes {
  let size = fromMm;
  for (let programmes = 0; programmes < maxProgrammes; programmes++) {
    const before = size;
    for (const [block, { rangeMPa, count }] of programme.entries()) {
      const drive = shapeFactor * rangeMPa;
      if (!growsFrom(law, drive, size)) continue;
      const after = sizeThroughStages(law, drive, size, count);
      if (after >= toMm) {
        const cyclesOfBlock = cyclesThroughStages(law, drive, [size, toMm]);
        return { status: 'reached', programmes, block, cyclesOfBlock, sizeMm: toMm };
      }
      size = after;
    }
    if (size === before) return ended('no growth', programmes, size);
  }
  return ended('programme limit', maxProgrammes, size);
}

const ended = (
  status: CountedProgrammes['status'],
  programmes: number,
  sizeMm: number,
): CountedProgrammes => ({ status, programmes, block: 0, cyclesOfBlock: 0, sizeMm });
