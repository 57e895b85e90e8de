import { extensionAtInstability, tearingSlope } from '../fracture/toughness/tearing-resistance';
import { tearingInstability } from '../fracture/toughness/tearing-instability';
import { tensileBelowRoom, yieldBelowRoom } from '../materials/strength/strength-at-temperature';
import { charpyLowerBoundMPaSqrtM, upperShelfMPaSqrtM } from '../materials/toughness/charpy';
import {
  capacityLimit,
  ctodFactor,
  kFromCtod,
  kFromJ,
  planeStrainSize,
} from '../materials/toughness/from-fracture-test';
import {
  arrestCurveMPaSqrtM,
  initiationCurveMetricMPaSqrtM,
  initiationCurveMPaSqrtM,
} from '../materials/toughness/reference-curves';
import { fromMPaSqrtMm, toMPaSqrtM, toMPaSqrtMm } from '../units/convert';
import type { CheckRow } from './check-row';
import { rowsOf, type Entry } from './entry';

const BS = 'BS 7910:2013 7.1 (from memory; forms seen in a secondary source)';
const ANNEX_J = 'BS 7910:2013 Annex J (from memory; form seen in a secondary source)';
const E1921 = 'ASTM E1921 (from memory)';
const ASME = 'ASME XI A-4200, as a script that quotes it gives it (secondary source)';
const TOUGHNESS = 'MPa·√m';

const STEEL = { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

const TESTS: readonly Entry[] = [
  [
    'K from J 100 N/mm',
    150.8219239608511,
    TOUGHNESS,
    1e-9,
    'closed form',
    '√(J E/(1 − ν²))',
    () => toMPaSqrtM(kFromJ(100, 207_000, 0.3)),
  ],
  [
    'factor on CTOD, σY 350, σU 500',
    1.699684545705901,
    '',
    1e-9,
    'from memory',
    BS,
    () => ctodFactor(350, 500),
  ],
  [
    'K from CTOD 0.2 mm',
    164.5120292447945,
    TOUGHNESS,
    1e-9,
    'from memory',
    BS,
    () => toMPaSqrtM(kFromCtod(0.2, STEEL)),
  ],
  [
    'capacity of a ligament of 25 mm, σY 450, M = 30',
    292.0653998716688,
    TOUGHNESS,
    1e-9,
    'from memory',
    E1921,
    () => toMPaSqrtM(capacityLimit(207_000, 25, 450, 0.3)),
  ],
  [
    'least size for KIc 50, σY 500',
    25,
    'mm',
    1e-9,
    'from memory',
    'ASTM E399 (from memory)',
    () => planeStrainSize(toMPaSqrtMm(50, TOUGHNESS), 500),
  ],
];

const CHARPY: readonly Entry[] = [
  [
    'lower bound from 27 J in 25 mm',
    62.35382907247958,
    TOUGHNESS,
    1e-9,
    'from memory',
    ANNEX_J,
    () => charpyLowerBoundMPaSqrtM(27, 25),
  ],
  [
    'lower bound from 40 J in 50 mm',
    67.00162245826557,
    TOUGHNESS,
    1e-9,
    'from memory',
    ANNEX_J,
    () => charpyLowerBoundMPaSqrtM(40, 50),
  ],
  [
    'upper shelf from 100 J, σY 450',
    165.843299533023,
    TOUGHNESS,
    1e-9,
    'from memory',
    'Barsom and Rolfe (from memory)',
    () => upperShelfMPaSqrtM(100, 450),
  ],
  [
    'upper shelf from 100 J, σY 450, by 5 (CVN/σY − 0.05) in ft·lb, ksi and inches',
    166.6633857844045,
    TOUGHNESS,
    0.015,
    'from memory',
    'Barsom and Rolfe in US units (from memory): the rounding of the constants',
    () => upperShelfMPaSqrtM(100, 450),
  ],
];

const REFERENCE: readonly Entry[] = [
  [
    'KIc at RTNDT',
    53.934,
    'ksi·√in',
    1e-9,
    'published table',
    ASME,
    () => fromMPaSqrtMm(toMPaSqrtMm(initiationCurveMPaSqrtM(0), TOUGHNESS), 'ksi·√in'),
  ],
  [
    'KIa at RTNDT',
    39.22,
    'ksi·√in',
    1e-3,
    'published table',
    ASME,
    () => fromMPaSqrtMm(toMPaSqrtMm(arrestCurveMPaSqrtM(0), TOUGHNESS), 'ksi·√in'),
  ],
  ...[
    [0, 59.26502501126159],
    [50, 174.313269129159],
  ].map(([dt = 0, k = 0]): Entry => [
    `KIc by SI constants against US constants, ${dt} °C above RTNDT`,
    k,
    TOUGHNESS,
    0.002,
    'from memory',
    'ASME XI, SI edition (from memory)',
    () => initiationCurveMetricMPaSqrtM(dt),
  ]),
];

const STRENGTH: readonly Entry[] = [
  [
    'yield strength 350 at −100 °C',
    482.5434083601286,
    'MPa',
    1e-9,
    'from memory',
    BS,
    () => yieldBelowRoom(350, -100),
  ],
  [
    'tensile strength 500 at −100 °C',
    610.532571849915,
    'MPa',
    1e-9,
    'from memory',
    BS,
    () => tensileBelowRoom(500, -100),
  ],
];

const TEARING = { coefficient: 200, exponent: 0.4, validToMm: 50 };
const torn = () => {
  const found = tearingInstability(TEARING, (extension) => 10 + extension);
  return found.status === 'found' ? found : { factorOnJ: Number.NaN, extensionMm: Number.NaN };
};
const INSTABILITY: readonly Entry[] = [
  [
    'extension at instability, JR = 200 Δa^0.4, J = β a, a0 10',
    6.666666666666667,
    'mm',
    1e-9,
    'closed form',
    'tangency of the two curves',
    () => extensionAtInstability(10, 0.4),
  ],
  [
    'slope β at instability',
    25.62977198029445,
    'N/mm²',
    1e-6,
    'closed form',
    'tangency of the two curves',
    () => tearingSlope(TEARING, extensionAtInstability(10, 0.4)),
  ],
  [
    'extension at instability by search',
    6.666666666666667,
    'mm',
    1e-5,
    'closed form',
    'tangency of the two curves',
    () => torn().extensionMm,
  ],
  [
    'slope β at instability by search',
    25.62977198029445,
    'N/mm²',
    1e-9,
    'closed form',
    'tangency of the two curves',
    () => torn().factorOnJ,
  ],
];

/** Toughness from tests and correlations, strength and tearing. */
export const TOUGHNESS_CHECKS: readonly CheckRow[] = rowsOf('Toughness', 'TO', [
  ...TESTS,
  ...CHARPY,
  ...REFERENCE,
  ...STRENGTH,
  ...INSTABILITY,
]);
