/** How a count of single cycles ended. */
export interface CountedCycles {
  readonly status: 'reached' | 'no growth' | 'cycle limit';
  readonly cycles: number;
  readonly sizeMm: number;
}

/**
 * Adds the growth of one cycle after the other until the flaw has reached what ends it; slow and plain, to
 * hold a faster way against.
 * @param fromMm size at the start [mm]
 * @param perCycle growth in one cycle at a size [mm/cycle]
 * @param reached whether the size after a cycle ends the count
 */
export function cycleByCycle(
  fromMm: number,
  perCycle: (size: number) => number,
  reached: (size: number) => boolean,
  { maxCycles = 1e7 }: { readonly maxCycles?: number } = {},
): CountedCycles {
  let size = fromMm;
  for (let cycles = 0; cycles < maxCycles; cycles++) {
    if (reached(size)) return { status: 'reached', cycles, sizeMm: size };
    const growth = perCycle(size);
    if (!(growth > 0)) return { status: 'no growth', cycles, sizeMm: size };
    size += growth;
  }
  return { status: 'cycle limit', cycles: maxCycles, sizeMm: size };
}
