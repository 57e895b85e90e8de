import type { ThresholdLine } from '../../materials/crack-law';

/**
 * Threshold of ΔK at a stress ratio: a line in R, cut at a least and a most value.
 * @param line value at R = 0, its fall with R, and the two cuts [MPa·√mm]
 * @param stressRatio minimum over maximum, R [-]
 * @returns threshold ΔK0 [MPa·√mm]
 * @validity constant amplitude; not for corrosion fatigue nor for a spectrum with large cycles
 * @source form of BS 7910 8.2.3 and of ASME XI A-4300 (from memory)
 * @example thresholdAt({ atZero: 170, slope: 214, least: 63, most: 170 }, 0.25) // 116.5
 */
export const thresholdAt = (
  { atZero, slope, least, most }: ThresholdLine,
  stressRatio: number,
): number => Math.min(most, Math.max(least, atZero - slope * stressRatio));
