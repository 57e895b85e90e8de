import { levelTwoLine, optionTwoLine } from '../fracture/fad/diagram-lines';
import { LEVEL_TWO_CUT_OFFS, levelTwoHeight } from '../fracture/fad/level-two';
import {
  angularMisalignment,
  axialMisalignment,
  unequalMisalignment,
  type AngularJoint,
} from '../fracture/fad/misalignment';
import {
  dropStrength,
  hardening,
  plateauRatio,
  plateauStrain,
  type DiagramMaterial,
} from '../fracture/fad/option-one';
import { optionTwoHeight } from '../fracture/fad/option-two';
import { rambergOsgoodCurve } from '../fracture/fad/stress-strain-curve';
import { toughnessRatioByFactor } from '../fracture/fad/toughness-ratio';
import { holePeakFactor } from '../fracture/stress-raisers/hole-edge';
import { notchShortCrackFactor } from '../fracture/stress-intensity/hole-crack';
import { linearised, termsOf } from '../fracture/stress-intensity/stress-terms';
import { mm } from '../units/quantity';
import type { CheckRow } from './check-row';
import { rowsOf, type Entry } from './entry';

const BS = 'BS 7910:2013 7.3.3 (from memory)';
const LEVEL_TWO =
  'API 579-1 Part 9, R6 revision 3 (from memory; the form stands in several public texts)';
const ANNEX_D = 'BS 7910 Annex D, IIW (from memory)';

const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const SMOOTH = { ...STEEL, yieldMPa: 400, youngsModulusMPa: 200_000 };
const OPTION_TWO = optionTwoLine(
  SMOOTH,
  rambergOsgoodCurve({
    youngsModulusMPa: 200_000,
    yieldMPa: 400,
    exponent: 10,
    plasticStrain: 0.002,
  }),
);

const CONSTANTS: readonly Entry[] = [
  ['N = 0.3 (1 − σY/σU)', 0.09, '', 1e-9, 'from memory', BS, () => hardening(STEEL)],
  [
    'μ of a soft steel, capped',
    0.6,
    '',
    1e-9,
    'from memory',
    BS,
    () => dropStrength({ ...STEEL, yieldMPa: 300, tensileMPa: 450 }),
  ],
  [
    'strain of the yield plateau, σY 350',
    0.024375,
    '',
    1e-9,
    'from memory',
    BS,
    () => plateauStrain(350),
  ],
  [
    'λ of the yield plateau',
    15.41607142857143,
    '',
    1e-9,
    'closed form',
    BS,
    () => plateauRatio(STEEL),
  ],
];

const OPTION_TWO_ROWS: readonly Entry[] = [
  ...[
    [0.8, 0.840261816799213],
    [1, 2 / 3],
    [1.1, 0.5316353964584717],
  ].map(([lr = 0, f = 0]): Entry => [
    `f(${lr}), Option 2, ε = σ/E + 0.002 (σ/σY)¹⁰, E/σY 500`,
    f,
    '',
    1e-9,
    'closed form',
    'E ε/σ = 1 + Lr⁹ for this curve',
    () => OPTION_TWO.height(lr),
  ]),
  [
    'f(0.6), Option 2 of an elastic curve',
    0.9205746178983234,
    '',
    1e-9,
    'closed form',
    '(1 + Lr²/2)^−½',
    () => optionTwoHeight(0.6, 1),
  ],
];

const LEVEL_TWO_ROWS: readonly Entry[] = [
  ...[
    [0, 1],
    [0.5, 0.9581741741948934],
    [0.8, 0.8105591366406056],
    [1, 0.5722715576101317],
  ].map(([lr = 0, f = 0]): Entry => [
    `f(${lr}), Level 2`,
    f,
    '',
    1e-9,
    'from memory',
    LEVEL_TWO,
    () => levelTwoHeight(lr),
  ]),
  [
    'cut-off with a yield plateau or unknown hardening',
    1,
    '',
    0,
    'from memory',
    LEVEL_TWO,
    () => levelTwoLine(LEVEL_TWO_CUT_OFFS.unknown, STEEL).lrMax,
  ],
  [
    'cut-off of carbon–manganese steel',
    1.25,
    '',
    0,
    'from memory',
    LEVEL_TWO,
    () => levelTwoLine(LEVEL_TWO_CUT_OFFS.carbonManganese, STEEL).lrMax,
  ],
  [
    'Kr with V, KIp 60, KIs 40, Kmat 150, Lr 0.6',
    0.7175311102990201,
    '',
    1e-9,
    'closed form',
    'identity with ρ',
    () => toughnessRatioByFactor({ kPrimary: 60, kSecondary: 40, toughness: 150, lr: 0.6 }),
  ],
];

const linear = linearised(termsOf([180, -120]));
const parabola = linearised(termsOf([0, 0, 100]));
const JOINT: AngularJoint = {
  peakMm: 2,
  thicknessMm: 20,
  halfLengthMm: 300,
  membraneMPa: 150,
  youngsModulusMPa: 207_000,
  ends: 'fixed',
};

const STRESSES: readonly Entry[] = [
  [
    'peak factor of a circular hole under tension',
    3,
    '',
    0,
    'closed form',
    'Kirsch 1898',
    () => holePeakFactor(0),
  ],
  [
    'F of a crack at the edge of a circular hole, its length going to 0',
    3.3645,
    '',
    1e-9,
    'closed form',
    '1.1215 times the peak factor',
    () => notchShortCrackFactor(mm(0), mm(10), mm(10)),
  ],
  ['Pm of 180 falling to 60', 120, 'MPa', 1e-9, 'closed form', 'definition', () => linear.membrane],
  ['Pb of 180 falling to 60', 60, 'MPa', 1e-9, 'closed form', 'definition', () => linear.bending],
  ['Pm of 100 (x/t)²', 100 / 3, 'MPa', 1e-7, 'closed form', 'σ0/3', () => parabola.membrane],
  ['Pb of 100 (x/t)²', -50, 'MPa', 1e-7, 'closed form', '−σ0/2', () => parabola.bending],
  [
    'km of an offset of 5 between walls of 10 and 20',
    1.783611624891224,
    '',
    1e-9,
    'from memory',
    ANNEX_D,
    () => unequalMisalignment(5, 10, 20),
  ],
  [
    'km of an offset of 1.5 between walls of 15, unequal form',
    1.3,
    '',
    1e-9,
    'closed form',
    '1 + 3 e/t',
    () => unequalMisalignment(1.5, 15, 15),
  ],
  [
    'km of an offset of 1.5 between walls of 15, equal form',
    1.3,
    '',
    1e-9,
    'closed form',
    '1 + 3 e/t',
    () => axialMisalignment(1.5, 15),
  ],
  [
    'km of an angle at a small stress, fixed ends',
    1.3,
    '',
    1e-6,
    'closed form',
    '1 + 3 y/t',
    () => angularMisalignment({ ...JOINT, membraneMPa: 1e-6 }),
  ],
  [
    'km of an angle at 150 MPa, fixed ends',
    1.259075642459307,
    '',
    1e-9,
    'from memory',
    ANNEX_D,
    () => angularMisalignment(JOINT),
  ],
];

/** The lines of the diagram beside Option 1, and the stresses that go into it. */
export const DIAGRAM_LINE_CHECKS: readonly CheckRow[] = rowsOf('Failure assessment diagram', 'FM', [
  ...CONSTANTS,
  ...OPTION_TWO_ROWS,
  ...LEVEL_TWO_ROWS,
  ...STRESSES,
]);
