/** Scatter of T0 estimated from T27J, one standard deviation [°C] (JCSS Part 3.12). */
export const T0_FROM_T27_DEVIATION_C = 15;

/**
 * Reference temperature from the temperature of 27 J: T0 = T27J − 18.
 * @param t27 temperature of 27 J Charpy energy, T27J [°C]
 * @returns mean estimate of T0 [°C]
 * @validity ferritic steel; standard deviation 15 °C
 * @source JCSS Probabilistic Model Code Part 3.12, equation 4.2; BS 7910:2013 Annex J (from memory)
 * @example t0FromT27(-20) // -38
 */
export const t0FromT27 = (t27: number): number => t27 - 18;

/**
 * Reference temperature from the temperature of 40 J: T0 = T40J − 24.
 * @param t40 temperature of 40 J Charpy energy, T40J [°C]
 * @returns mean estimate of T0 [°C]
 * @validity ferritic steel
 * @source BS 7910:2013 Annex J (from memory)
 * @example t0FromT40(-10) // -34
 */
export const t0FromT40 = (t40: number): number => t40 - 24;
