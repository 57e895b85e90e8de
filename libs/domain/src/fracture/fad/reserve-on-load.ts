import { firstCrossing } from '../../numerics/first-crossing';

/**
 * Factor on the primary load that first brings the point to the line, counted up from no load at all; the
 * margin re-evaluates the interaction of secondary stress at every trial. Below 1 when outside, 0 when the
 * secondary stress alone is outside.
 * @param margin room left to the line at a factor on the primary load, above 0 inside [-]
 * @param largest factor at which the cut-off Lr,max is certainly reached [-]
 * @returns reserve factor on load [-]
 * @validity margin continuous but for jumps; a jump across the line counts as the line
 * @source definition, BS 7910 and R6: only primary stress is scaled
 * @example reserveOnLoad((f) => 2 - f, 4) // 2
 */
export function reserveOnLoad(margin: (factor: number) => number, largest: number): number {
  if (!Number.isFinite(largest) || largest <= 0) return 0;
  const crossing = firstCrossing(margin, 0, largest * (1 + 1e-9), { tolerance: 1e-10 });
  switch (crossing.status) {
    case 'found':
      return crossing.x;
    case 'below from the start':
    case 'not a number':
      return 0;
    case 'none':
      return largest;
  }
}
