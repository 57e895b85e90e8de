import { toMm } from '../units/convert';
import type { LengthUnit } from './recognise-columns';

/** A length in millimetres, without the noise of binary fractions. */
export const toMillimetres = (value: number, unit: LengthUnit): number =>
  Number(toMm(value, unit).toPrecision(12));
