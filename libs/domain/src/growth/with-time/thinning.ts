/** A wall that corrodes evenly, on the face opposite to the crack or on the one it starts from. */
export interface Thinning {
  readonly rateMmPerYear: number;
  readonly face: 'opposite' | 'cracked';
}

/**
 * Wall left after a time: B0 − r t, never below 0.
 * @param wall wall now, B0 [mm]
 * @param rate corrosion rate, r [mm/year]
 * @param years time from now, t [years]
 * @returns wall then [mm]
 * @validity even corrosion at a constant rate
 * @source B = B0 − r t
 * @example wallAfter(20, 0.1, 25) // 17.5
 */
export const wallAfter = (wall: number, rate: number, years: number): number =>
  Math.max(wall - rate * years, 0);

/**
 * Factor by which a membrane stress rises as the wall thins under the same load: B0/(B0 − r t).
 * @param wall wall now, B0 [mm]
 * @param rate corrosion rate, r [mm/year]
 * @param years time from now, t [years]
 * @returns factor on the membrane stress; Infinity once the wall is gone [-]
 * @validity load kept; membrane stress of a thin wall
 * @source equilibrium
 * @example stressRise(20, 0.1, 25) // 1.142857142857
 */
export const stressRise = (wall: number, rate: number, years: number): number =>
  wall / wallAfter(wall, rate, years);

/**
 * Net rate of the depth of a crack in a wall that corrodes: on the opposite face the crack's own, on the
 * cracked face less what its mouth loses.
 * @param growth growth of the tip into the wall [mm/year]
 * @param thinning corrosion rate and the face it is on [mm/year]
 * @returns rate of the depth, below 0 where corrosion takes the crack away [mm/year]
 * @validity even corrosion
 * @source superposition of the two surfaces
 * @example netDepthRate(0.4, { rateMmPerYear: 0.1, face: 'cracked' }) // 0.3
 */
export const netDepthRate = (growth: number, { rateMmPerYear, face }: Thinning): number =>
  face === 'cracked' ? growth - rateMmPerYear : growth;

/**
 * Time until a crack growing at a constant rate has reached a share of a wall that thins: on the opposite
 * face (q B0 − a0)/(v + q r), on the cracked face with v − r for v.
 * @param depth depth now, a0 [mm]
 * @param wall wall now, B0 [mm]
 * @param share share of the wall, q = a/B [-]
 * @param growth growth of the tip, v [mm/year]
 * @param thinning corrosion rate and the face it is on [mm/year]
 * @returns time; 0 when it is reached already, Infinity when never [years]
 * @validity constant rates; share between 0 and 1
 * @source a0 + v t = q (B0 − r t)
 * @example yearsToShare(4, 20, 0.8, 0.4, { rateMmPerYear: 0.1, face: 'opposite' }) // 25
 */
export function yearsToShare(
  depth: number,
  wall: number,
  share: number,
  growth: number,
  thinning: Thinning,
): number {
  const room = share * wall - depth;
  if (room <= 0) return 0;
  const closing = netDepthRate(growth, thinning) + share * thinning.rateMmPerYear;
  const years = room / closing;
  // a crack that corrosion takes away meets the share only where the wall is gone: never
  return closing > 0 && wallAfter(wall, thinning.rateMmPerYear, years) > 0 ? years : Infinity;
}
