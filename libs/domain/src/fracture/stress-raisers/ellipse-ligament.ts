import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { firstCrossing } from '../../numerics/first-crossing';
import { degrees, mm, mpa } from '../../units/quantity';
import { noStress } from '../stress-state';
import { ellipseField } from './ellipse-field';
import { fitThroughWall, type WallFit } from './fit-through-wall';
import { LENGTH_HINT, STRESS_HINT } from './hole-rules';
import { inglisFactor } from './inglis';

/** A loaded elliptical hole or notch as a user gives it. */
export interface EllipseInput {
  /** Half axis across the stress, towards the ligament. */
  readonly halfAxisAcrossMm: number;
  readonly halfAxisAlongMm: number;
  /** Stress far away across the ligament [MPa]. */
  readonly stressMPa: number;
  /** Stress far away along the ligament over that across it, −1 to 1. */
  readonly ratio: number;
  readonly pressureMPa: number;
}

/** The stress a flaw at the end of the axis grows into. */
export interface EllipseLigament extends WallFit {
  readonly status: 'found';
  readonly peakFactor: number;
  /** Stress at the edge, pressure included [MPa]. */
  readonly peakMPa: number;
  /** Radius of the edge there, B²/A [mm]. */
  readonly rootRadiusMm: number;
  /** Distance over which the excess at the edge falls to a tenth [mm]; null when it has not within 20 half axes. */
  readonly decayMm: number | null;
  readonly stressAt: (distanceMm: number) => number;
}

/**
 * Stress across the ligament ahead of an elliptical hole, from the edge to a given length, by the exact
 * field: peak, decay, and the membrane, bending and polynomial that a flaw's stress is entered as.
 * Refuses every number that is impossible, and a slit that is a crack already.
 */
export function ellipseLigament(input: EllipseInput, lengthMm: number): EllipseLigament | Refused {
  const { halfAxisAcrossMm: a, halfAxisAlongMm: b, ratio, stressMPa } = input;
  const broken = outOfBounds(rulesOf(input, lengthMm));
  if (broken.length > 0) return refused(...broken);
  const field = ellipseField(
    { across: mm(a), along: mm(b) },
    { stress: mpa(stressMPa), ratio, angle: degrees(90), pressure: mpa(input.pressureMPa) },
  );
  const state = noStress();
  const stressAt = (distance: number) => field(a + Math.max(distance, 0), 0, state).yy;
  const peakMPa = stressAt(0);
  const excess = (x: number) => (stressAt(x) - stressMPa) / (peakMPa - stressMPa) - 0.1;
  const decay = peakMPa === stressMPa ? null : firstCrossing(excess, 0, 20 * Math.max(a, b));
  return {
    status: 'found',
    ...fitThroughWall(stressAt, lengthMm),
    peakFactor: inglisFactor(mm(a), mm(b), ratio),
    peakMPa,
    rootRadiusMm: (b * b) / a,
    decayMm: decay?.status === 'found' ? decay.x : null,
    stressAt,
  };
}

function rulesOf(input: EllipseInput, lengthMm: number): readonly NumberRule[] {
  const { halfAxisAcrossMm: a, halfAxisAlongMm: b } = input;
  const root = (b * b) / a;
  const length = { unit: 'mm', min: 0.1, max: 1e4, instead: LENGTH_HINT };
  const stress = { unit: 'MPa', instead: STRESS_HINT };
  const sizes = [
    { ...length, input: 'ellipse.halfAxisAcrossMm', name: 'Half axis across', value: a },
    { ...length, input: 'ellipse.halfAxisAlongMm', name: 'Half axis along', value: b },
  ];
  return [
    ...sizes,
    { ...SLIT, value: a / b },
    { ...stress, ...STRESS, value: input.stressMPa },
    { ...stress, ...PRESSURE, value: input.pressureMPa },
    { ...RATIO, value: input.ratio },
    { ...LINE, value: lengthMm, min: root / 1000, max: 20 * root },
  ];
}

const SLIT = {
  input: 'ellipse.halfAxisAlongMm',
  name: 'Half axis across over half axis along',
  unit: '',
  min: 0.01,
  max: 20,
  instead: 'Assess a narrower slit as a crack.',
} as const;

const STRESS = { input: 'ellipse.stressMPa', name: 'Stress far away', min: -2000, max: 2000 };
const PRESSURE = { input: 'ellipse.pressureMPa', name: 'Pressure', min: 0, max: 200 };

const RATIO = {
  input: 'ellipse.ratio',
  name: 'Biaxial ratio',
  unit: '',
  min: -1,
  max: 1,
  instead: 'Divide the stress along the ligament by that across it.',
} as const;

const LINE = {
  input: 'lengthMm',
  name: 'Length along the ligament',
  unit: 'mm',
  instead: `Fit the stress over the flaw, at most twenty times the radius of the edge. ${LENGTH_HINT}`,
} as const;
