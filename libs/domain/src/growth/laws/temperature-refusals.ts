import { outOfBounds, type Refusal } from '../../geometry/refusal';
import type { CrackLaw } from '../../materials/crack-law';

/** Why a law may not be used at a temperature, or without one; a law that does not know it may go without. */
export function temperatureRefusals(
  { form, scope, title }: CrackLaw,
  temperatureC: number | undefined,
): readonly Refusal[] {
  if (temperatureC === undefined) return form === 'austenitic air' ? [missing(title)] : [];
  const [cold, hot] = scope.temperatureC;
  return outOfBounds([
    {
      input: 'temperatureC',
      name: 'Temperature',
      unit: '°C',
      value: temperatureC,
      min: cold,
      max: hot,
      instead: 'Choose a law for this temperature, or scale one by the modulus.',
    },
  ]);
}

const missing = (title: string): Refusal => ({
  input: 'temperatureC',
  limit: 'must be given',
  value: null,
  message: `${title} depends on the temperature, and none is given.`,
  instead: 'Give the metal temperature in °C.',
});
