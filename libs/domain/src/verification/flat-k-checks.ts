import { centreCrackFactor, pointForceK } from '../fracture/stress-intensity/centre-crack';
import {
  edgeTensionPolynomial,
  edgeTensionTada,
  halfPlaneEdgeFactor,
} from '../fracture/stress-intensity/edge-crack';
import { ellipseK, pennyK, pennyProfileK } from '../fracture/stress-intensity/embedded-crack';
import { HOLE_CORNER_ONE_K, HOLE_CORNER_TWO_K } from '../fracture/stress-intensity/hole-corner-k';
import { holeOneCrackFactor, holeTwoCracksFactor } from '../fracture/stress-intensity/hole-crack';
import {
  HOLE_SURFACE_ONE_K,
  HOLE_SURFACE_TWO_K,
} from '../fracture/stress-intensity/hole-surface-k';
import { nozzleCornerK } from '../fracture/stress-intensity/nozzle-corner-k';
import { PLATE_CORNER_K } from '../fracture/stress-intensity/plate-corner-k';
import { PLATE_THROUGH_WALL_K } from '../fracture/stress-intensity/plate-through-wall-k';
import { stripCoefficient } from '../fracture/stress-intensity/strip-coefficient';
import { completeEllipticE } from '../numerics/complete-elliptic';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import { degrees, mm, mpa } from '../units/quantity';
import { kOf, type CrackSymbols } from './crack-of';
import type { CheckKind, CheckRow } from './check-row';
import { CORNER_VALUES, ELLIPSE_VALUES, HOLE_VALUES } from './data/flat-equation-values';

type Value = readonly [
  quantity: string,
  published: number,
  tolerance: number,
  compute: () => number,
  unit?: string,
];

const rows = (
  prefix: string,
  kind: CheckKind,
  source: string,
  values: readonly Value[],
): readonly CheckRow[] =>
  values.map(([quantity, published, tolerance, compute, unit = ''], i) => ({
    id: `${prefix}-${i + 1}`,
    group: 'Stress intensity',
    quantity,
    published,
    unit,
    tolerance,
    kind,
    source,
    compute,
  }));

const HALF_PLANE = 1.1215222552;
const K_UNIT = 'MPa·√mm';
const METRES = MPA_SQRT_MM_PER['MPa·√m'];
const SECOND = 'Newman and Raju 1984: the published equation in a second, separate program';

const through = (c: number, W = Infinity) =>
  kOf(PLATE_THROUGH_WALL_K, { a: 10, c, t: 10, W }, 0, 1) / Math.sqrt(Math.PI * c);

const ISIDA: readonly (readonly [number, number])[] = [
  [0.1, 1.006],
  [0.2, 1.0246],
  [0.4, 1.1094],
  [0.5, 1.1867],
  [0.7, 1.4882],
  [0.8, 1.816],
];
const centre = rows(
  'KC',
  'from memory',
  'Isida, central crack (from memory)',
  ISIDA.map(([alpha, f]) => [
    `F of a central crack, 2c/W ${alpha}`,
    f,
    0.0015,
    () => through(50 * alpha, 100),
  ]),
);

const BOWIE: readonly (readonly [number, number])[] = [
  [0.2, 2.41299234562],
  [1, 1.47205489707],
  [3, 1.16359173252],
];
const bowie = rows(
  'KH',
  'from memory',
  'Newman 1971, collocation for two cracks at a hole (from memory)',
  BOWIE.map(([c, f]) => [
    `F of two cracks at a hole, c/R ${c}`,
    f,
    0.003,
    () => holeTwoCracksFactor(mm(c), mm(1)),
  ]),
);

const limits = rows('KX', 'exact limit', 'exact limit of the elastic problem', [
  [
    'K of a 20 mm crack in a wide plate, 100 MPa',
    17.7245385091,
    1e-9,
    () => (100 * through(10) * Math.sqrt(Math.PI * 10)) / METRES,
    'MPa·√m',
  ],
  ['F of a short central crack', 1, 1e-9, () => centreCrackFactor(0)],
  ['F of a short edge crack, handbook form', HALF_PLANE, 0.001, () => edgeTensionTada(1e-6)],
  ['F of a short edge crack, own fit', HALF_PLANE, 1e-4, () => stripCoefficient(0, 1e-9)],
  ['F of an edge crack of a half plane', HALF_PLANE, 1e-9, halfPlaneEdgeFactor],
  [
    'F of two short cracks at a hole, 3 × 1.1215',
    3 * HALF_PLANE,
    0.0015,
    () => holeTwoCracksFactor(mm(1e-6), mm(1)),
  ],
  [
    'F of one short crack at a hole, 3 × 1.1215',
    3 * HALF_PLANE,
    0.0015,
    () => holeOneCrackFactor(mm(1e-6), mm(1)),
  ],
  [
    'F of one very long crack at a hole',
    Math.SQRT1_2,
    1e-4,
    () => holeOneCrackFactor(mm(1e6), mm(1)),
  ],
  [
    'K of a force pair at the middle of a crack',
    0.564189583548,
    1e-9,
    () => pointForceK(1, mm(1), mm(0)),
    K_UNIT,
  ],
  ['K of a penny crack, 100 MPa, a 5', 252.313252202, 1e-9, () => pennyK(mpa(100), mm(5)), K_UNIT],
  [
    'K of a penny crack under (r/a)²',
    0.752252778064,
    1e-8,
    () => pennyProfileK((r) => mpa(r ** 2), mm(1)),
    K_UNIT,
  ],
  [
    'K of a penny crack under (r/a)³',
    0.66467019409,
    1e-8,
    () => pennyProfileK((r) => mpa(r ** 3), mm(1)),
    K_UNIT,
  ],
]);

const ellipses = rows(
  'KI',
  'exact limit',
  'Green and Sneddon 1950, Irwin 1962, evaluated with many digits',
  ELLIPSE_VALUES.map(([a, c, phi, k, tolerance]) => [
    `K of an ellipse in an infinite body, a ${a}, c ${c}, φ ${phi}°, 1 MPa`,
    k,
    tolerance,
    () => ellipseK(mpa(1), mm(a), mm(c), degrees(phi)),
    K_UNIT,
  ]),
);

const BENCHMARK = 'published finite-element validation manual, opened';
const benchmarks = rows('KB', 'published table', BENCHMARK, [
  ['F of an edge crack, polynomial, α 0.1', 1.186, 0.0005, () => edgeTensionPolynomial(0.1)],
  ['F of an edge crack, handbook form, α 0.1', 1.196, 0.0005, () => edgeTensionTada(0.1)],
  [
    'K of an edge crack 2.5 m deep in 10 m, 1 MPa',
    4.205998,
    0.002,
    () => edgeTensionPolynomial(0.25) * Math.sqrt(Math.PI * 2.5),
    'MPa·√m',
  ],
  [
    'K at the minor axis of a 25 × 6 ellipse, 1 MPa',
    4.068,
    0.001,
    () => ellipseK(mpa(1), mm(6), mm(25), degrees(90)),
    K_UNIT,
  ],
  [
    'K at the major axis of a 25 × 6 ellipse, 1 MPa',
    1.99290485473,
    0.001,
    () => ellipseK(mpa(1), mm(6), mm(25), degrees(0)),
    K_UNIT,
  ],
  ['E(k) of a 25 × 6 ellipse', 1.0672, 0.001, () => completeEllipticE(1 - (6 / 25) ** 2)],
]);

const polynomial = rows('KG', 'closed form', 'Gross, Srawley and Brown: the published polynomial', [
  ['F of an edge crack, polynomial, α 0.3', 1.6621242, 1e-9, () => edgeTensionPolynomial(0.3)],
  ['F of an edge crack, polynomial, α 0.5', 2.829125, 1e-9, () => edgeTensionPolynomial(0.5)],
]);

const equation = (prefix: string, values: readonly Value[]) =>
  rows(prefix, 'independent computation', SECOND, values);

const corners = equation(
  'KR',
  CORNER_VALUES.map(([a, c, t, W, phi, sm, sb, k]) => [
    `corner flaw in a plate, a ${a}, c ${c}, t ${t}, W ${W}, φ ${phi}°, ${sm} + ${sb} MPa`,
    k,
    1e-6,
    () => kOf(PLATE_CORNER_K, { a, c, t, W }, phi, sm, sb),
    K_UNIT,
  ]),
);

const HOLE_SOLUTIONS = {
  'corner 1': HOLE_CORNER_ONE_K,
  'corner 2': HOLE_CORNER_TWO_K,
  'surface 1': HOLE_SURFACE_ONE_K,
  'surface 2': HOLE_SURFACE_TWO_K,
} as const;
const holes = equation(
  'KN',
  HOLE_VALUES.map(([which, a, c, t, phi, sm, sb, k]) => [
    `${which} flaw(s) at a hole, a ${a}, c ${c}, t ${t}, r 5, W 100, φ ${phi}°, ${sm} + ${sb} MPa`,
    k,
    1e-6,
    () => kOf(HOLE_SOLUTIONS[which], atHole(a, c, t), phi, sm, sb),
    K_UNIT,
  ]),
);

const atHole = (a: number, c: number, t: number): CrackSymbols => ({ a, c, t, r: 5, W: 100 });

const nozzle = rows(
  'KZ',
  'from memory',
  'quarter-circular crack at a nozzle corner (from memory)',
  [
    [
      'K at a nozzle corner, 100 MPa, a 5',
      286.548563617,
      1e-6,
      () => nozzleCornerK([100], 5),
      K_UNIT,
    ],
    [
      'K at a nozzle corner, 100 − 5x + 0.1x² MPa, a 5',
      254.08123464,
      1e-6,
      () => nozzleCornerK([100, -5, 0.1, 0], 5),
      K_UNIT,
    ],
  ],
);

/** Published values of the solutions of flat walls, holes and nozzle corners. */
export const FLAT_K_CHECKS: readonly CheckRow[] = [
  ...limits,
  ...centre,
  ...benchmarks,
  ...polynomial,
  ...bowie,
  ...ellipses,
  ...corners,
  ...holes,
  ...nozzle,
];
