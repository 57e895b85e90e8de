import type { IndicationType, Mechanism } from '@ligament/domain/contract/vocabulary';

/**
 * Why a finding is outside what the product assesses, and whom to ask; null when it is within.
 * Common practice: hydrogen attack, laminar findings and the creep range need other methods than a crack-like assessment.
 */
export function outOfScope(
  mechanism: Mechanism,
  indicationType: IndicationType | undefined,
): string | null {
  if (mechanism === 'hydrogen attack') {
    return 'Hydrogen attack is not crack-like growth from one front, and ultrasonic sizing of it is unreliable: no stress intensity and no life are given. Refer it to a corrosion and materials specialist for a hydrogen-attack survey.';
  }
  if (mechanism === 'creep') {
    return 'In the creep range a crack grows with time at constant load and this method does not hold: no life is given. Refer it to a specialist for a creep life study with replicas.';
  }
  if (indicationType === 'lamination') {
    return 'A lamination lies parallel to the surface and is not opened by the pressure stress: assess it by the rules for laminations and hydrogen blisters. Refer it to a specialist.';
  }
  return null;
}
