import {
  referenceTemperature,
  type ToughnessTest,
} from '../fracture/toughness/reference-temperature-tests';
import {
  masterCurveBoundMPaSqrtM,
  masterCurveFractileMPaSqrtM,
  masterCurveMedianMPaSqrtM,
  masterCurveScaleMPaSqrtM,
  toFrontLengthMPaSqrtM,
  toughnessScaleMPaSqrtM,
} from '../materials/toughness/master-curve';
import { t0FromT27 } from '../materials/toughness/reference-temperature';
import { scaleOfTests } from '../materials/toughness/t0-from-tests';
import { toughnessFractile, toughnessProbability } from '../materials/toughness/weibull-toughness';
import type { CheckRow } from './check-row';
import { rowsOf, type Entry } from './entry';

const E1921 = 'ASTM E1921 (from memory)';
const E1921_SEEN = 'ASTM E1921, as several public texts quote it';
const JCSS = 'JCSS Probabilistic Model Code Part 3.12, equations 4.1 and 4.2';
const TOUGHNESS = 'MPa·√m';

const test = (temperatureC: number, kJcMPaSqrtM: number, censored = false): ToughnessTest => ({
  temperatureC,
  kJcMPaSqrtM,
  thicknessMm: 25.4,
  censored,
  capacity: null,
});
const t0Of = (tests: readonly ToughnessTest[]): number => {
  const found = referenceTemperature(tests);
  return found.status === 'found' ? found.t0C : Number.NaN;
};
const AT_ONE = [70, 85, 95, 102, 118, 131];
const AT_SEVERAL: readonly ToughnessTest[] = [
  ...[62, 75, 81].map((k) => test(-100, k)),
  ...[90, 105, 88].map((k) => test(-80, k)),
  ...[112, 126, 97].map((k) => test(-60, k)),
  ...[140, 150].map((k) => test(-40, k)),
  test(-40, 160, true),
];

const CURVE: readonly Entry[] = [
  ['T0 from T27J −20', -38, '°C', 1e-9, 'published table', JCSS, () => t0FromT27(-20)],
  [
    'median at T0',
    100,
    TOUGHNESS,
    1e-9,
    'published table',
    E1921_SEEN,
    () => masterCurveMedianMPaSqrtM(0, 0),
  ],
  ['scale at T0', 108, TOUGHNESS, 1e-9, 'from memory', E1921, () => masterCurveScaleMPaSqrtM(0, 0)],
  ...[
    [-50, 39.35472145843475],
    [0, 61.8],
    [50, 119.83697353096],
  ].map(([dt = 0, k = 0]): Entry => [
    `5 % fractile ${dt} °C from T0 against 25.2 + 36.6 exp(0.019 ΔT)`,
    k,
    TOUGHNESS,
    0.002,
    'from memory',
    E1921,
    () => masterCurveFractileMPaSqrtM(dt, 0, 0.05),
  ]),
  [
    '95 % fractile at T0 against 34.5 + 101.3',
    135.8,
    TOUGHNESS,
    0.002,
    'from memory',
    E1921,
    () => masterCurveFractileMPaSqrtM(0, 0, 0.95),
  ],
  [
    '1 % fractile at T0',
    47.86299620968918,
    TOUGHNESS,
    1e-9,
    'closed form',
    'Weibull form with slope 4 from 20',
    () => masterCurveFractileMPaSqrtM(0, 0, 0.01),
  ],
  [
    '100 of a front of 25.4 mm in 50 mm',
    87.53920045713156,
    TOUGHNESS,
    1e-9,
    'closed form',
    '20 + (K − 20)(B1/B2)^¼',
    () => toFrontLengthMPaSqrtM(100, 25.4, 50),
  ],
  [
    'lower bound at 0 °C, T0 −38, B 40, P 5 %, allowance 25 °C',
    66.36516854277806,
    TOUGHNESS,
    1e-9,
    'from memory',
    'BS 7910:2013 Annex J (from memory)',
    () =>
      masterCurveBoundMPaSqrtM(0, {
        t0C: -38,
        thicknessMm: 40,
        probability: 0.05,
        allowanceC: 25,
      }),
  ],
  [
    'spread at 10 °C from T27J −20, B 40',
    182.1054004199061,
    TOUGHNESS,
    1e-9,
    'closed form',
    JCSS,
    () => toughnessScaleMPaSqrtM(10, -20, 40),
  ],
  [
    'probability of less than 60 with K0 120',
    0.02527509839820608,
    '',
    1e-9,
    'closed form',
    JCSS,
    () => toughnessProbability(60, 120),
  ],
  [
    'fractile of that probability',
    60,
    TOUGHNESS,
    1e-9,
    'closed form',
    JCSS,
    () => toughnessFractile(0.02527509839820608, 120),
  ],
];

const T0: readonly Entry[] = [
  [
    'scale of six tests at one temperature',
    107.0795359717023,
    TOUGHNESS,
    1e-9,
    'independent computation',
    'ASTM E1921, as scripts that quote it have it',
    () => scaleOfTests(AT_ONE, 6),
  ],
  [
    'T0 of six tests at −80 °C',
    -79.42725411266126,
    '°C',
    1e-9,
    'independent computation',
    'ASTM E1921, as scripts that quote it have it',
    () => t0Of(AT_ONE.map((k) => test(-80, k))),
  ],
  [
    'T0 of twelve tests at four temperatures, one censored',
    -68.38016837163728,
    '°C',
    1e-5,
    'independent computation',
    'direct search of the greatest likelihood',
    () => t0Of(AT_SEVERAL),
  ],
];

const drawn = (rows: readonly (readonly [temperature: number, ...values: number[]])[]) =>
  rows.flatMap(([temperature, ...values]) => values.map((k) => test(temperature, k)));
const SETS: readonly (readonly [t0: number, tests: readonly ToughnessTest[]])[] = [
  [
    -75.58557952781469,
    [
      ...drawn([
        [-110, 56.5, 67.6, 61.7, 69.6],
        [-90, 88.6, 55.2, 43.4, 100],
        [-70, 90.8, 88.8, 166.1, 105.4],
        [-50, 140.9, 155.5, 105.7],
      ]),
      test(-50, 170, true),
    ],
  ],
  [
    14.73040050994647,
    drawn([
      [-20, 64.3, 85.1, 81],
      [0, 59, 62.6, 68.5],
      [20, 149.6, 103.2, 115.3],
      [40, 124.3, 143.7, 132.7],
    ]),
  ],
];
const OWN_SETS = SETS.map(([t0, tests]): Entry => [
  `T0 of ${tests.length} tests drawn at random`,
  t0,
  '°C',
  1e-5,
  'independent computation',
  'own search of the greatest likelihood itself, not of its slope',
  () => t0Of(tests),
]);

/** The master curve, its distribution and the reference temperature. */
export const MASTER_CURVE_CHECKS: readonly CheckRow[] = rowsOf('Toughness', 'TM', [
  ...CURVE,
  ...T0,
  ...OWN_SETS,
]);
