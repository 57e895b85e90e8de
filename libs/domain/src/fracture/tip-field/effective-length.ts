import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { firstCrossing } from '../../numerics/first-crossing';
import { mpa, mpaSqrtMm } from '../../units/quantity';
import type { PlaneCondition } from '../stress-state';
import { plasticRadius } from './plastic-zone';

/** A crack lengthened by the radius of its own plastic zone. */
export interface EffectiveLength {
  readonly status: 'found';
  readonly lengthMm: number;
  readonly plasticRadiusMm: number;
  /** K of the lengthened crack [MPa·√mm]. */
  readonly intensity: number;
}

export interface EffectiveLengthInput {
  readonly lengthMm: number;
  /** The crack cannot be longer: the wall, or the limit of the solution for K. */
  readonly longestMm: number;
  readonly yieldMPa: number;
  readonly condition: PlaneCondition;
  /** K of a crack of a length [mm], in MPa·√mm. */
  readonly intensityAt: (lengthMm: number) => number;
}

/**
 * Length of the crack with its plastic zone, the smallest root of aₑ = a + r_y(K(aₑ)), bracketed (Irwin
 * 1960). Refuses when the zone grows faster than the length: the ligament yields before it settles.
 */
export function effectiveLength(input: EffectiveLengthInput): EffectiveLength | Refused {
  const { lengthMm, longestMm, yieldMPa, condition, intensityAt } = input;
  const broken = outOfBounds([
    { ...LENGTH, value: lengthMm },
    { ...LONGEST, value: longestMm, min: lengthMm },
    { ...YIELD, value: yieldMPa },
  ]);
  if (broken.length > 0) return refused(...broken);
  const radiusAt = (length: number) =>
    plasticRadius(mpaSqrtMm(intensityAt(length)), mpa(yieldMPa), condition);
  const left = (length: number) => lengthMm + radiusAt(length) - length;
  const { status, x } = firstCrossing(left, lengthMm, longestMm, { intervals: 64 });
  if (status === 'found' || status === 'below from the start') {
    return {
      status: 'found',
      lengthMm: x,
      plasticRadiusMm: radiusAt(x),
      intensity: intensityAt(x),
    };
  }
  return refused({
    input: 'crack.lengthMm',
    limit: `a plastic zone that settles before ${longestMm} mm`,
    value: lengthMm,
    message:
      status === 'none'
        ? `The plastic zone does not settle before the crack is ${longestMm} mm long.`
        : 'The stress intensity is not a number over the whole range of length.',
    instead: 'Use the failure assessment diagram, which takes plastic collapse into account.',
  });
}

const LENGTH = {
  input: 'crack.lengthMm',
  name: 'Crack size',
  unit: 'mm',
  min: 0,
  max: 1e5,
  above: true,
  instead: 'Give the depth or half length in millimetres.',
} as const;

const LONGEST = {
  input: 'longestMm',
  name: 'Longest crack',
  unit: 'mm',
  max: 1e6,
  above: true,
  instead: 'Give the wall, or the limit of the solution, beyond the crack itself.',
} as const;

const YIELD = {
  input: 'material.yieldMPa',
  name: 'Yield strength',
  unit: 'MPa',
  min: 50,
  max: 2000,
  instead: 'Give it in MPa (N/mm²).',
} as const;
