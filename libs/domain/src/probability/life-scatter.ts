import { normalBelow, normalQuantile } from '../numerics/normal-distribution';

/**
 * Probability that a life has ended by a time when only the growth coefficient scatters, lognormally: life is
 * inversely proportional to the coefficient, so ln life is normal about the life at the median coefficient.
 * @param years time [years]
 * @param medianLife life at the median coefficient, the other variables as they are [years]
 * @param sdOfLog standard deviation of ln C [-]
 * @returns probability that the life is over [-]
 * @validity the coefficient multiplies the whole law (all stages); medianLife above 0
 * @source closed form, N ∝ 1/C
 * @example lifeEndedBy(10, 20, 0.3945) // 0.039456597308
 */
export const lifeEndedBy = (years: number, medianLife: number, sdOfLog: number): number =>
  medianLife === Infinity ? 0 : normalBelow(Math.log(years / medianLife) / sdOfLog);

/**
 * Life not reached with a given probability when only the growth coefficient scatters, lognormally.
 * @param share probability that the life is shorter [-]
 * @param medianLife life at the median coefficient [years]
 * @param sdOfLog standard deviation of ln C [-]
 * @returns fractile of the life [years]
 * @validity the coefficient multiplies the whole law (all stages); 0 < share < 1
 * @source closed form, N ∝ 1/C
 * @example lifeFractile(0.05, 20, 0.3945) // 10.4524616757
 */
export const lifeFractile = (share: number, medianLife: number, sdOfLog: number): number =>
  medianLife * Math.exp(sdOfLog * normalQuantile(share));
