/** Molar gas constant [kJ/(mol·K)]; exact by the definition of the SI of 2019, eight digits. */
const GAS = 8.3144626e-3;
const ZERO_C = 273.15;

/**
 * Rate at one temperature over the rate at another: exp(−Q/R (1/T − 1/Tref)).
 * @param activation activation energy, Q [kJ/mol]
 * @param temperature metal temperature [°C]
 * @param reference temperature of the reference rate [°C]
 * @returns factor on the rate [-]
 * @validity one mechanism between the two temperatures
 * @source Arrhenius
 * @example arrhenius(130, 290, 325) // 0.1969930
 */
export const arrhenius = (activation: number, temperature: number, reference: number): number =>
  Math.exp((-activation / GAS) * (1 / (temperature + ZERO_C) - 1 / (reference + ZERO_C)));
