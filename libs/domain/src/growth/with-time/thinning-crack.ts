import { netDepthRate, stressRise, type Thinning } from './thinning';

/** A crack at a constant rate in a wall that thins under a load that stays. */
export interface ThinningCrack {
  readonly depthMm: number;
  readonly wallMm: number;
  readonly growthMmPerYear: number;
  readonly thinning: Thinning;
  readonly stressMPa: number;
  readonly shapeFactor: number;
}

/**
 * Stress intensity of a crack after a time, at constant shape factor: Y S0 B0/(B0 − r t) √(π a), a = a0 + v t
 * on the opposite face and a0 + (v − r) t on the cracked one.
 * @param crack sizes now, rates, stress now and shape factor [mm]
 * @param years time from now, t [years]
 * @returns K then; 0 for a crack that corrosion has taken away [MPa·√mm]
 * @validity constant rates; crack inside the wall; wall not gone
 * @source K = Y S √(πa) with the stress of the thinner wall
 * @example stressIntensityAfter({ depthMm: 4, wallMm: 20, growthMmPerYear: 0, thinning: { rateMmPerYear: 0.1, face: 'opposite' }, stressMPa: 100, shapeFactor: 1 }, 100) // 708.98154
 */
export function stressIntensityAfter(crack: ThinningCrack, years: number): number {
  const { depthMm, wallMm, growthMmPerYear, thinning, stressMPa, shapeFactor } = crack;
  const depth = Math.max(depthMm + netDepthRate(growthMmPerYear, thinning) * years, 0);
  const stress = stressMPa * stressRise(wallMm, thinning.rateMmPerYear, years);
  return shapeFactor * stress * Math.sqrt(Math.PI * depth);
}
