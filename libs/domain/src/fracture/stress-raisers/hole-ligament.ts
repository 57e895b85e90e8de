import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { degrees, mm, mpa } from '../../units/quantity';
import { fitThroughWall, type WallFit } from './fit-through-wall';
import { holeDecayLength, holeGradient, holeLigamentStress, holePeakFactor } from './hole-edge';
import { holeRules, LENGTH_HINT, type HoleInput } from './hole-rules';

/** The stress a flaw at the edge of a hole grows into. */
export interface HoleLigament extends WallFit {
  readonly status: 'found';
  readonly peakFactor: number;
  /** Stress at the edge, pressure included [MPa]. */
  readonly peakMPa: number;
  /** Distance over which the excess at the edge falls to a tenth [mm]. */
  readonly decayMm: number;
  /** Relative gradient at the edge [1/mm]. */
  readonly gradientPerMm: number;
  readonly stressAt: (distanceMm: number) => number;
}

/**
 * Stress across the ligament beside a hole, from the edge to a given length: peak, decay, and the
 * membrane, bending and polynomial (in x over the length) that a flaw's stress is entered as. Refuses
 * every number that is impossible or in another unit.
 */
export function holeLigament(hole: HoleInput, lengthMm: number): HoleLigament | Refused {
  const length = { ...LENGTH, value: lengthMm, min: hole.radiusMm / 1000, max: hole.radiusMm * 20 };
  const broken = outOfBounds([...holeRules(hole), length]);
  if (broken.length > 0) return refused(...broken);
  const radius = mm(hole.radiusMm);
  const load = {
    stress: mpa(hole.stressMPa),
    ratio: hole.ratio,
    angle: degrees(0),
    pressure: mpa(hole.pressureMPa),
  };
  const stressAt = (distance: number) =>
    holeLigamentStress(radius, load, mm(Math.max(distance, 0)));
  return {
    status: 'found',
    ...fitThroughWall(stressAt, lengthMm),
    peakFactor: holePeakFactor(hole.ratio),
    peakMPa: stressAt(0),
    decayMm: holeDecayLength(radius, hole.ratio, 0.1),
    gradientPerMm: holeGradient(radius, hole.ratio),
    stressAt,
  };
}

const LENGTH = {
  input: 'lengthMm',
  name: 'Length along the ligament',
  unit: 'mm',
  instead: `Fit the stress over the flaw or the ligament, at most twenty hole radii. ${LENGTH_HINT}`,
} as const;
