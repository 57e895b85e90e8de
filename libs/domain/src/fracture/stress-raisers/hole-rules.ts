import type { NumberRule } from '../../geometry/refusal';

/** A loaded circular hole as a user gives it. */
export interface HoleInput {
  readonly radiusMm: number;
  /** Larger stress far from the hole [MPa]. */
  readonly stressMPa: number;
  /** Smaller over larger stress, −1 to 1. */
  readonly ratio: number;
  /** Pressure on the edge of the hole [MPa]. */
  readonly pressureMPa: number;
}

export const LENGTH_HINT =
  'Give it in millimetres; a value in metres or inches is the usual mistake.';
export const STRESS_HINT =
  'Give it in MPa (N/mm²); a value in kPa, psi or ksi is the usual mistake.';
const PRESSURE_HINT = 'Give it in MPa; a value in bar is ten times too large.';
const RATIO_HINT =
  'Divide the smaller stress by the larger: ½ in a cylinder under pressure, 1 in a sphere.';

/** What the numbers of a loaded hole may be. */
export const holeRules = (hole: HoleInput): readonly NumberRule[] => [
  {
    input: 'hole.radiusMm',
    name: 'Hole radius',
    unit: 'mm',
    value: hole.radiusMm,
    min: 0.1,
    max: 1e4,
    instead: LENGTH_HINT,
  },
  {
    input: 'hole.stressMPa',
    name: 'Stress far from the hole',
    unit: 'MPa',
    value: hole.stressMPa,
    min: -2000,
    max: 2000,
    instead: STRESS_HINT,
  },
  {
    input: 'hole.ratio',
    name: 'Biaxial ratio',
    unit: '',
    value: hole.ratio,
    min: -1,
    max: 1,
    instead: RATIO_HINT,
  },
  {
    input: 'hole.pressureMPa',
    name: 'Pressure in the hole',
    unit: 'MPa',
    value: hole.pressureMPa,
    min: 0,
    max: 200,
    instead: PRESSURE_HINT,
  },
];
