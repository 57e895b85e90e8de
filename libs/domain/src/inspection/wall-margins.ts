import type { ImportContext } from './import-context';
import type { Size } from './read-size';

/** Allowed mismatch of depths and wall [mm]: 1 mm or 5 % of the wall; common practice. */
export const depthTolerance = (wall: number): number => Math.max(1, 0.05 * wall);

/** Metal above the upper tip and below the lower one, seen from the scan surface [mm]; undefined without a depth. */
export function marginsOf(
  context: ImportContext,
  size: Size | undefined,
): { above: number; below: number } | undefined {
  if (!size || size.depthToTopMm === null) return undefined;
  const wall = size.wallMm ?? context.wallMm;
  return { above: size.depthToTopMm, below: wall - size.depthToTopMm - size.heightMm };
}
