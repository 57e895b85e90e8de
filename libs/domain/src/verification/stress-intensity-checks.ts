import { freeStripFactor } from '../fracture/stress-intensity/free-strip-factor';
import { newmanRaju1980 } from '../fracture/stress-intensity/newman-raju-1980';
import { PLATE_EMBEDDED_K } from '../fracture/stress-intensity/plate-embedded-k';
import { PLATE_SURFACE_K } from '../fracture/stress-intensity/plate-surface-k';
import { shapeFactor } from '../fracture/stress-intensity/shape-factor';
import { degrees, mm, mpa } from '../units/quantity';
import { crackOf, kOf } from './crack-of';
import type { CheckKind, CheckRow } from './check-row';
import { EQUATION_VALUES, EMBEDDED_VALUES, PRESSURISED_VALUES } from './data/equation-values';
import { TENSION_FACTORS } from './data/tension-factors';

const GROUP = 'Stress intensity';
const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
): CheckRow => ({ id, group: GROUP, quantity, published, unit, tolerance, kind, source, compute });

const SECOND = 'the published equation in a second, separate program (double precision)';

const surface = EQUATION_VALUES.map(([a, c, t, W, phi, sm, sb, k], i) =>
  row(
    `KS-${i + 1}`,
    `surface flaw in a plate, a ${a}, c ${c}, t ${t}, W ${W}, φ ${phi}°, ${sm} + ${sb} MPa`,
    k,
    'MPa·√mm',
    1e-6,
    'independent computation',
    `Newman and Raju 1984: ${SECOND}`,
    () => kOf(PLATE_SURFACE_K, { a, c, t, W }, phi, sm, sb),
  ),
);

const embedded = EMBEDDED_VALUES.map(([a, c, half, phi, k], i) =>
  row(
    `KE-${i + 1}`,
    `embedded flaw at mid-thickness, a ${a}, c ${c}, t ${2 * half}, φ ${phi}°, 100 MPa`,
    k,
    'MPa·√mm',
    1e-6,
    'independent computation',
    `Newman and Raju 1984: ${SECOND}`,
    () => kOf(PLATE_EMBEDDED_K, { a, c, t: 2 * half, p: half - a }, phi, 100),
  ),
);

const pressurised = PRESSURISED_VALUES.map(([p, a, c, t, Ri, phi, k], i) =>
  row(
    `KP-${i + 1}`,
    `axial flaw inside a cylinder under pressure, a ${a}, c ${c}, t ${t}, Ri ${Ri}, φ ${phi}°`,
    k,
    'MPa·√mm',
    1e-6,
    'independent computation',
    `Newman and Raju 1980 (from memory): ${SECOND}`,
    () => newmanRaju1980(mpa(p), crackOf({ a, c, t, Ri }), degrees(phi)),
  ),
);

/** F in K = F σ √(πa/Q). */
const tensionFactor = (a: number, c: number, t: number, phi: number) =>
  kOf(PLATE_SURFACE_K, { a, c, t }, phi, 1) / Math.sqrt((Math.PI * a) / shapeFactor(mm(a), mm(c)));

const tables = TENSION_FACTORS.map(([c, t, phi, f, source], i) =>
  row(
    `KT-${i + 1}`,
    `F of a surface flaw in tension, a/c ${+(1 / c).toFixed(3)}, a/t ${+(1 / t).toFixed(3)}, φ ${phi}°`,
    f,
    '',
    0.06,
    'from memory',
    source === 'RN'
      ? 'Raju and Newman 1979, table of finite-element results (from memory)'
      : 'influence coefficients for a flat plate, nuclear in-service inspection code (from memory)',
    () => tensionFactor(1, c, t, phi),
  ),
);

const LIMITS: readonly CheckRow[] = [
  row(
    'KL-1',
    'F of a very shallow, very long surface flaw',
    1.1215222552,
    '',
    0.01,
    'exact limit',
    'edge crack in a half plane',
    () => tensionFactor(1e-6, 1, 1000, 90),
  ),
  row(
    'KL-2',
    'K/(σ√(πa)) of a small embedded circle',
    0.636619772368,
    '',
    0.003,
    'exact limit',
    'penny-shaped crack, Sneddon 1946',
    () => kOf(PLATE_EMBEDDED_K, { a: 1, c: 1, t: 2e6, p: 1e6 }, 0, 1) / Math.sqrt(Math.PI),
  ),
  row(
    'KL-3',
    'F where the two branches meet, a/c just above 1',
    1.08378787879,
    '',
    0.0025,
    'exact limit',
    'the branch for a/c ≤ 1',
    () => tensionFactor(1.000001, 1, 2, 90),
  ),
];

const SHAPE = [
  [0.1, 1.03224288353],
  [0.2, 1.1035549289],
  [0.6, 1.62906917743],
  [0.8, 2.01096051361],
  [1, 2.46740110027],
] as const;
const shapes = SHAPE.map(([a, q], i) =>
  row(
    `KQ-${i + 1}`,
    `shape factor Q at a/c = ${a}`,
    q,
    '',
    0.003,
    'exact limit',
    'square of the complete elliptic integral of the second kind',
    () => shapeFactor(mm(a), mm(1)),
  ),
);

const STRIP = [
  [0.2, 1.3654],
  [0.4, 2.1068],
  [0.5, 2.8254],
  [0.6, 4.042],
  [0.8, 11.991],
] as const;
const strip = STRIP.map(([depth, f], i) =>
  row(
    `KF-${i + 1}`,
    `F of an edge crack in a strip free to bend, a/t ${depth}`,
    f,
    '',
    0.006,
    'from memory',
    'influence coefficients for a flat plate, column of the longest flaw (from memory)',
    () => freeStripFactor(depth),
  ),
);

export const STRESS_INTENSITY_CHECKS: readonly CheckRow[] = [
  ...shapes,
  ...surface,
  ...embedded,
  ...pressurised,
  ...tables,
  ...strip,
  ...LIMITS,
];
