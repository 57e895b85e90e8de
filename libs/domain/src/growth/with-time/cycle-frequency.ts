import { SECONDS_PER } from '../../units/time-rate';

/**
 * Growth per year of so many cycles a second, for the share of the time in which they come.
 * @param growth growth per cycle, da/dN [mm/cycle]
 * @param frequency cycles a second while running [Hz]
 * @param share share of the year in which the load cycles, 0 to 1 [-]
 * @returns growth per year [mm/year]
 * @validity marine laws were measured at 0.1 Hz to 1 Hz: faster cycles corrode less in each, slower ones more
 * @source f da/dN; frequencies of the tests behind BS 7910 after King 1998 (secondary source)
 * @example cyclicRate(1e-9, 1, 1) // 0.0315576
 */
export const cyclicRate = (growth: number, frequency: number, share: number): number =>
  growth * frequency * share * SECONDS_PER.year;
