import {
  axialInsideZahoor,
  circumferentialBending,
  circumferentialTension,
  fullCircumferenceZahoor,
} from '../fracture/stress-intensity/circumferential-factors';
import {
  axialThroughFactor,
  axialThroughFolias,
  axialThroughTada,
  axialThroughTwoTerms,
} from '../fracture/stress-intensity/through-wall-bulging';
import { bulgingFactor } from '../fracture/reference-stress/bulging-factor';
import type { CheckRow } from './check-row';
import { rowsOf, type Entry } from './entry';

const GROUP = 'Stress intensity';
const PROGRAM = 'the published equation in a second, separate program (double precision)';

const around = (
  load: string,
  factor: (share: number, ratio: number) => number,
  values: readonly (readonly [share: number, ratio: number, f: number])[],
): readonly Entry[] =>
  values.map(([share, ratio, f]) => [
    `circumferential crack through a pipe, ${load}, θ/π ${share}, R/t ${ratio}: F`,
    f,
    '',
    1e-6,
    'independent computation',
    `Zahoor: ${PROGRAM}`,
    () => factor(share, ratio),
  ]);

const along = (
  name: string,
  factor: (x: number) => number,
  values: readonly (readonly [x: number, f: number])[],
): readonly Entry[] =>
  values.map(([x, f]) => [
    `axial crack through a pipe, ${name}, c/√(Rt) ${x}: F`,
    f,
    '',
    1e-6,
    'from memory',
    `${name} (from memory): ${PROGRAM}`,
    () => factor(x),
  ]);

const flatLimit = (name: string, tolerance: number, factor: (x: number) => number): Entry => [
  `axial crack through a pipe, ${name}, a very short crack: F`,
  1,
  '',
  tolerance,
  'exact limit',
  'a plate',
  () => factor(1e-4 / Math.sqrt(100)),
];

const zahoorOnes: readonly Entry[] = [
  [
    'crack around the whole inside of a pipe, a/t 0.5, R/t 20: F',
    2.15707047191,
    '',
    1e-6,
    'from memory',
    `Zahoor (from memory): ${PROGRAM}`,
    () => fullCircumferenceZahoor(0.5, 20),
  ],
  [
    'axial surface crack inside a pipe, a/t 0.5, a/c 0.4, R/t 10: F',
    1.37040178571,
    '',
    1e-6,
    'from memory',
    `Zahoor (from memory): ${PROGRAM}`,
    () => axialInsideZahoor(0.5, 0.4, 10),
  ],
];

export const CURVED_K_CHECKS: readonly CheckRow[] = rowsOf(GROUP, 'KV', [
  ...around('tension', circumferentialTension, [
    [0.05, 10, 1.05965173548],
    [0.1, 10, 1.16963915951],
    [0.2, 20, 1.74344142433],
    [0.3, 10, 1.9897587335],
  ]),
  ...around('bending', circumferentialBending, [
    [0.05, 10, 1.0514007147],
    [0.1, 10, 1.14551245995],
    [0.2, 10, 1.41401432865],
    [0.2, 20, 1.61909582176],
  ]),
  ...zahoorOnes,
  [
    'axial crack through a pipe, Zahoor, c 10, R 100, t 10: F',
    1.13626508917,
    '',
    1e-6,
    'independent computation',
    `Zahoor: ${PROGRAM}`,
    () => axialThroughFactor(10 / Math.sqrt(1000)),
  ],
  ...along('Folias', axialThroughFolias, [[1, 1.61554944214]]),
  ...along('Folias with two terms', axialThroughTwoTerms, [
    [1, 1.49716398567],
    [2, 2.40914922742],
  ]),
  ...along('Tada', axialThroughTada, [
    [0.5, 1.14564392374],
    [2, 2.4],
  ]),
  flatLimit('Zahoor', 1e-4, axialThroughFactor),
  flatLimit('Folias', 1e-4, axialThroughFolias),
  flatLimit('Tada', 1e-4, axialThroughTada),
  flatLimit('rational fit', 0.0101, (x) => bulgingFactor(1.818 * x)),
]);
