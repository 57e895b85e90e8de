import type { Crack } from '../../geometry/crack';
import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import type { Degrees, MPa, MPaSqrtMm } from '../../units/quantity';
import { brokenLimits } from './broken-limits';
import type { HigherInfluence, Influence, StressIntensitySolution } from './solution';
import { kOfTerms } from './stress-terms';
import { pressureHoopTerms, type CrackedFace } from './wall-stress-terms';

/** K of an axial flaw from the pressure alone. */
export interface PressureK {
  readonly status: 'known';
  readonly k: MPaSqrtMm;
}

/**
 * K of an axial surface flaw in a pressurised cylinder of any thickness: Lamé's stress over the depth, with the
 * pressure on the faces of a flaw that opens to the inside. Refused outside the limits of the solution and for a
 * pressure that is none.
 */
export function axialPressureK(
  solution: StressIntensitySolution,
  face: CrackedFace,
  pressure: MPa,
  crack: Crack,
  angle: Degrees,
): PressureK | Refused {
  const refusals = [
    ...badPressure(pressure),
    ...badCylinder(crack),
    ...brokenLimits(solution.limits, crack),
  ];
  if (!solution.higher) refusals.push(NO_TERMS);
  if (refusals.length > 0 || !solution.higher) return refused(...refusals);
  const linear: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const higher: HigherInfluence = { quadratic: 0, cubic: 0, quartic: 0 };
  solution.influence(crack, angle, linear);
  solution.higher(crack, angle, higher);
  const k = kOfTerms(linear, higher, pressureHoopTerms(pressure, crack, face));
  return { status: 'known', k: k as MPaSqrtMm };
}

const badPressure = (pressure: number): readonly Refusal[] =>
  outOfBounds([
    {
      input: 'pressureMPa',
      name: 'The pressure',
      unit: 'MPa',
      value: pressure,
      min: 0,
      max: 1000,
      above: true,
      instead: 'Enter the pressure in MPa; 10 bar is 1 MPa.',
    },
  ]);

const badCylinder = ({ a, thickness, insideRadius }: Crack): readonly Refusal[] =>
  a > 0 && thickness > 0 && insideRadius < Infinity ? [] : [NO_CYLINDER];

const NO_CYLINDER: Refusal = {
  input: 'wall.insideDiameterMm',
  limit: 'a flaw in the wall of a cylinder',
  value: null,
  message: 'Pressure needs a cylinder with a radius, a wall and a flaw of some depth.',
  instead: 'Give the inside diameter, the wall and the depth.',
};

const NO_TERMS: Refusal = {
  input: 'flaw.kind',
  limit: 'a surface flaw',
  value: null,
  message: 'The solution takes membrane and bending only, not the stress of a thick wall.',
  instead: 'Linearise the stress.',
};
