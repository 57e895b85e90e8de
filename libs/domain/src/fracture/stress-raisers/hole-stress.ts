import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { degrees, mm, mpa } from '../../units/quantity';
import { firstPrincipal, vonMises } from '../principal-stress';
import { noStress, type PlaneStress } from '../stress-state';
import { holeRules, LENGTH_HINT, type HoleInput } from './hole-rules';
import { kirschField, kirschPolar, type PolarStress } from './kirsch-field';

/** Stress at a point beside a hole; the larger stress acts along the x axis. */
export interface HoleStress extends PolarStress {
  readonly status: 'found';
  readonly plane: Readonly<PlaneStress>;
  readonly firstPrincipal: number;
  readonly vonMises: number;
}

/**
 * Stress at a point beside a circular hole in a wide plate; a point inside the hole has none and is
 * refused. Refuses every number that is impossible or in another unit.
 */
export function holeStressAt(
  hole: HoleInput,
  { distanceMm, angleDegrees }: { readonly distanceMm: number; readonly angleDegrees: number },
): HoleStress | Refused {
  const broken = outOfBounds([
    ...holeRules(hole),
    { ...INSIDE, value: distanceMm, min: hole.radiusMm },
    { ...DIRECTION, value: angleDegrees },
  ]);
  if (broken.length > 0) return refused(...broken);
  const load = {
    stress: mpa(hole.stressMPa),
    ratio: hole.ratio,
    angle: degrees(0),
    pressure: mpa(hole.pressureMPa),
  };
  const theta = (angleDegrees * Math.PI) / 180;
  const field = kirschField(mm(hole.radiusMm), load);
  const plane = field(distanceMm * Math.cos(theta), distanceMm * Math.sin(theta), noStress());
  return {
    status: 'found',
    ...kirschPolar(mm(hole.radiusMm), load, mm(distanceMm), degrees(angleDegrees)),
    plane,
    firstPrincipal: firstPrincipal(plane),
    vonMises: vonMises(plane, 'plane stress', 0),
  };
}

const INSIDE = {
  input: 'point.distanceMm',
  name: 'Distance from the centre of the hole',
  unit: 'mm',
  max: 1e7,
  instead: `Inside the hole there is no wall. ${LENGTH_HINT}`,
} as const;

const DIRECTION = {
  input: 'point.angleDegrees',
  name: 'Direction of the point',
  unit: '°',
  min: -360,
  max: 360,
  instead: 'Give it in degrees from the direction of the larger stress.',
} as const;
