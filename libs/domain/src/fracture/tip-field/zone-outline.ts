import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { degrees, mpa, mpaSqrtMm } from '../../units/quantity';
import type { PlaneCondition } from '../stress-state';
import { yieldedEdge } from './near-tip-field';

/** Edge of the yielded zone around a tip at the origin, the crack along −x; first and last point are one. */
export interface ZoneOutline {
  readonly status: 'found';
  readonly points: readonly { readonly xMm: number; readonly yMm: number }[];
  /** Farthest the zone reaches from the tip [mm]. */
  readonly reachMm: number;
}

export interface ZoneInput {
  /** KI [MPa·√mm]. */
  readonly intensity: number;
  readonly yieldMPa: number;
  readonly condition: PlaneCondition;
  readonly poisson: number;
  /** Points to draw, at least 8. */
  readonly points: number;
}

/** Outline of the zone in which the near-tip field exceeds yield by von Mises. Refuses impossible numbers. */
export function zoneOutline(input: ZoneInput): ZoneOutline | Refused {
  const { intensity, yieldMPa, condition, poisson, points: count } = input;
  const broken = outOfBounds(
    ROWS.map(([key, name, unit, min, max, instead]) => ({
      input: key,
      name,
      unit,
      value: input[key],
      min,
      max,
      instead,
    })),
  );
  if (broken.length > 0) return refused(...broken);
  const whole = Math.floor(count);
  const edgeAt = (angle: number) =>
    yieldedEdge(mpaSqrtMm(intensity), mpa(yieldMPa), degrees(angle), condition, poisson);
  let reachMm = 0;
  const points = Array.from({ length: whole }, (_, i) => {
    const angle = -180 + (360 * i) / (whole - 1);
    const r = edgeAt(angle);
    reachMm = Math.max(reachMm, r);
    const theta = (angle * Math.PI) / 180;
    return { xMm: r * Math.cos(theta), yMm: r * Math.sin(theta) };
  });
  return { status: 'found', points, reachMm };
}

const ROWS: readonly (readonly [
  key: 'intensity' | 'yieldMPa' | 'poisson' | 'points',
  name: string,
  unit: string,
  min: number,
  max: number,
  instead: string,
])[] = [
  ['intensity', 'Stress intensity', 'MPa·√mm', 0, 5e4, 'Give it in MPa·√mm.'],
  ['yieldMPa', 'Yield strength', 'MPa', 50, 2000, 'Give it in MPa (N/mm²).'],
  ['poisson', 'Poisson’s ratio', '', 0, 0.5, 'Steel has about 0.3.'],
  ['points', 'Points', '', 8, 10_000, 'Ask for 8 to 10 000 points.'],
];
