import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import {
  STRENGTH_TEMPERATURE_C,
  tensileBelowRoom,
  yieldBelowRoom,
} from '../../materials/strength/strength-at-temperature';
import type { Given, Provenance } from '../../units/provenance';
import { weakestOrigin } from './toughness-result';
import { rule, ruleOf } from './toughness-rules';

/** Strengths at room temperature, and the temperature wanted. */
export interface StrengthInput {
  readonly yieldMPa: Given;
  readonly tensileMPa: Given;
  readonly temperatureC: number;
}

/** Strengths at a temperature. */
export interface StrengthAnswer {
  readonly status: 'found';
  readonly yieldMPa: number;
  readonly tensileMPa: number;
  readonly provenance: Provenance;
  readonly source: string;
}

/** Strengths of ferritic steel at a temperature below room; above it they fall and must be given. */
export function strengthAtTemperature(input: StrengthInput): StrengthAnswer | Refused {
  const { yieldMPa, tensileMPa, temperatureC } = input;
  const refusals = outOfBounds([
    ruleOf('strength', 'yieldMPa', yieldMPa),
    { ...ruleOf('strength', 'tensileMPa', tensileMPa), min: Math.max(yieldMPa.value, 50) },
    {
      ...rule('temperature', 'temperatureC', temperatureC),
      ...STRENGTH_TEMPERATURE_C,
      instead: 'Above room temperature give the strengths of the code tables at the temperature.',
    },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  // at room temperature the forms do not quite give back what they start from
  const room = temperatureC === STRENGTH_TEMPERATURE_C.max;
  return {
    status: 'found',
    yieldMPa: room ? yieldMPa.value : yieldBelowRoom(yieldMPa.value, temperatureC),
    tensileMPa: room ? tensileMPa.value : tensileBelowRoom(tensileMPa.value, temperatureC),
    provenance: weakestOrigin([yieldMPa, tensileMPa]),
    source: 'BS 7910:2013 7.1.3.4 (from memory; form seen in a secondary source)',
  };
}
