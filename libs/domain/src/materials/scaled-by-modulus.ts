import type { CrackLaw, PowerOfRange, ThresholdLine } from './crack-law';

/**
 * A law for another modulus: growth depends on ΔK/E, so every coefficient takes (E1/E2)^m, which is the
 * published (E1/E2)³ at m = 3, and the threshold falls with E2/E1. For a hot metal E1 is the modulus at
 * 20 °C, for another metal that of steel. Laws that hold a toughness or a temperature of their own stay as
 * they are.
 */
export function scaledByModulus(law: CrackLaw, modulus: number, other: number): CrackLaw {
  if (law.form !== 'stages') return law;
  const ratio = modulus / other;
  const scaled = ({ coefficient, exponent }: PowerOfRange): PowerOfRange => ({
    coefficient: coefficient * ratio ** exponent,
    exponent,
  });
  return {
    ...law,
    stages: law.stages.map(scaled),
    threshold: scaledThreshold(law.threshold, ratio),
    source: `${law.source}; scaled by modulus, BS 7910 (from memory)`,
  };
}

/** A law for hot metal: scaled by the moduli, and holding at that temperature alone. */
export function heated(
  law: CrackLaw,
  {
    modulusCold,
    modulusHot,
    temperatureC,
  }: { readonly modulusCold: number; readonly modulusHot: number; readonly temperatureC: number },
): CrackLaw {
  const scaled = scaledByModulus(law, modulusCold, modulusHot);
  return { ...scaled, scope: { ...law.scope, temperatureC: [temperatureC, temperatureC] } };
}

const scaledThreshold = (
  { atZero, slope, least, most }: ThresholdLine,
  ratio: number,
): ThresholdLine => ({
  atZero: atZero / ratio,
  slope: slope / ratio,
  least: least / ratio,
  most: most / ratio,
});
