import { interaction } from '../fracture/fad/interaction';
import { lrMax, optionOne, type DiagramMaterial } from '../fracture/fad/option-one';
import {
  leastAcceptable,
  type AcceptanceBoundary,
} from '../fracture/limiting-flaw/acceptance-search';
import { limitingLocus } from '../fracture/limiting-flaw/limiting-locus';
import { plateSurfaceReference } from '../fracture/reference-stress/plate-surface-reference';
import {
  PLATE_SURFACE_K,
  PLATE_SURFACE_LIMITS,
} from '../fracture/stress-intensity/plate-surface-k';
import { roomToUpperBounds } from '../geometry/limit';
import { mpa } from '../units/quantity';
import type { CheckRow } from './check-row';
import { crackOf, kOf } from './crack-of';

const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const PRIMARY = 200;
const wall = (a: number, c: number) => ({ a, c, t: 25, W: 500 });

/** Room to the line of the plate at its deepest point and its ends; toughness in MPa·√m. */
function margin(a: number, c: number, toughness: number, residual: number): number {
  const lr = plateSurfaceReference(crackOf(wall(a, c)), mpa(PRIMARY), mpa(0)) / STEEL.yieldMPa;
  const kr = [90, 0].map((angle) => {
    const [kp, ks] = [PRIMARY, residual].map((stress) =>
      kOf(PLATE_SURFACE_K, wall(a, c), angle, stress),
    ) as [number, number];
    return (kp + ks) / (toughness * Math.sqrt(1000)) + interaction(kp, ks, lr);
  });
  return Math.min(optionOne(lr, STEEL) - Math.max(...kr), lrMax(STEEL) - lr);
}

/** Depth on the locus at the shortest of a range of lengths. */
function depthAt(length: number, toughness: number, residual: number): number {
  const locus = limitingLocus({
    margin: (a, c) => margin(a, c, toughness, residual),
    validity: (a, c) => roomToUpperBounds(PLATE_SURFACE_LIMITS, crackOf(wall(a, c))).room,
    thicknessMm: 25,
    shortestHalfLengthMm: length / 2,
    longestHalfLengthMm: length,
    lengths: 2,
  });
  return locus.status === 'found' ? (locus.points[0]?.depthMm ?? Number.NaN) : Number.NaN;
}

const valueOf = (boundary: AcceptanceBoundary) =>
  boundary.status === 'found' ? boundary.value : Number.NaN;

const leastToughness = (a: number, c: number): number =>
  valueOf(
    leastAcceptable({
      input: 'material.toughnessMPaSqrtM',
      name: 'toughness',
      unit: 'MPa·√m',
      least: 20,
      most: 500,
      margin: (toughness) => margin(a, c, toughness, 0),
    }),
  );

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Limiting size',
  quantity,
  published,
  unit,
  tolerance,
  kind: 'independent computation',
  source: 'root search with a separate program on the same published equations',
  compute,
});

const DEPTHS = [
  [50, 80, 0, 19.82745924838106],
  [75, 80, 0, 15.69613737692961],
  [100, 80, 0, 13.386],
  [150, 80, 0, 11.49699354517984],
  [200, 80, 0, 10.56957146124895],
  [50, 120, 105, 19.19137610317165],
  [100, 120, 105, 12.6182114403938],
  [200, 120, 105, 10.00897651432411],
] as const;

export const LIMITING_LOCUS_CHECKS: readonly CheckRow[] = [
  ...DEPTHS.map(([length, toughness, residual, depth], i) =>
    row(
      `LL-1.${i + 1}`,
      `depth on the locus at 2c = ${length} mm, Kmat ${toughness} MPa·√m, Qm ${residual} MPa`,
      depth,
      'mm',
      4e-4,
      () => depthAt(length, toughness, residual),
    ),
  ),
  ...DEPTHS.filter(([, , residual]) => residual === 0).map(([length, toughness, , depth], i) =>
    row(
      `LL-2.${i + 1}`,
      `least toughness for a flaw ${depth.toFixed(3)} mm deep, 2c = ${length} mm`,
      toughness,
      'MPa·√m',
      1e-3,
      () => leastToughness(depth, length / 2),
    ),
  ),
];
