import { toFahrenheit } from '../../units/convert';
import { celsius } from '../../units/quantity';

/**
 * Growth of austenitic steel in air by temperature: 10^(8.12e-4 T − 1.13e-6 T² + 1.02e-9 T³), T in °F as
 * published; multiplies the coefficient 10^−10.009.
 * @param temperature metal temperature [°C]
 * @returns factor on the coefficient [-]
 * @validity 21 °C to 427 °C
 * @source ASME XI C-8410 (from memory)
 * @example austeniticHeat(20) // 1.1228238
 */
export function austeniticHeat(temperature: number): number {
  const t = toFahrenheit(celsius(temperature));
  return 10 ** (t * (8.12e-4 + t * (-1.13e-6 + t * 1.02e-9)));
}

/**
 * Factor on growth of austenitic steel in air by stress ratio: 1 | 1 + 1.8 R | 57.97 R − 43.35, breaks at
 * R = 0 and 0.79; published with a step of 1 % at 0.79.
 * @param stressRatio minimum over maximum, R [-]
 * @returns factor S [-]
 * @validity R < 1
 * @source ASME XI C-8410 (from memory)
 * @example austeniticScale(0.5) // 1.9
 */
export function austeniticScale(stressRatio: number): number {
  if (stressRatio <= 0) return 1;
  return stressRatio <= 0.79 ? 1 + 1.8 * stressRatio : 57.97 * stressRatio - 43.35;
}
