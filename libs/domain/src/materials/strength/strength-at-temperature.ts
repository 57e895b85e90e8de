/** Temperatures the forms below are used for [°C]: below room temperature; the lower end is common practice. */
export const STRENGTH_TEMPERATURE_C = { min: -196, max: 20 } as const;

/**
 * Yield strength of ferritic steel below room temperature: σY + 10⁵/(491 + 1.8 T) − 189.
 * @param yieldRoom yield strength at room temperature, σY [MPa]
 * @param temperature temperature, T [°C]
 * @returns yield strength at the temperature [MPa]
 * @validity below room temperature; at 20 °C it gives 0.75 MPa too much
 * @source BS 7910:2013 7.1.3.4 (from memory; form seen in a secondary source)
 * @example yieldBelowRoom(350, -100) // 482.5434084
 */
export const yieldBelowRoom = (yieldRoom: number, temperature: number): number =>
  yieldRoom + 1e5 / (491 + 1.8 * temperature) - 189;

/**
 * Tensile strength of ferritic steel below room temperature: σU (0.7857 + 0.2423 exp(−T/170.646)).
 * @param tensileRoom tensile strength at room temperature, σU [MPa]
 * @param temperature temperature, T [°C]
 * @returns tensile strength at the temperature [MPa]
 * @validity below room temperature
 * @source BS 7910:2013 7.1.3.4 (from memory; form seen in a secondary source)
 * @example tensileBelowRoom(500, -100) // 610.5325718
 */
export const tensileBelowRoom = (tensileRoom: number, temperature: number): number =>
  tensileRoom * (0.7857 + 0.2423 * Math.exp(-temperature / 170.646));
