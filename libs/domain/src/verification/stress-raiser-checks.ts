import { inglisFactor, notchFactor } from '../fracture/stress-raisers/inglis';
import { ellipseField } from '../fracture/stress-raisers/ellipse-field';
import { fitThroughWall } from '../fracture/stress-raisers/fit-through-wall';
import {
  holeEdgeStress,
  holeGradient,
  holeLigamentStress,
  holePeakFactor,
} from '../fracture/stress-raisers/hole-edge';
import { kirschField, kirschPolar } from '../fracture/stress-raisers/kirsch-field';
import type { RemoteLoad } from '../fracture/stress-raisers/remote-load';
import { noStress } from '../fracture/stress-state';
import { degrees, mm, mpa } from '../units/quantity';
import type { CheckKind, CheckRow } from './check-row';
import { STRIP_FACTOR_CHECKS } from './strip-factor-checks';

const row = (
  id: string,
  quantity: string,
  published: number,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
  unit = '',
): CheckRow => ({
  id,
  group: 'Stress raisers',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

const load = (more: Partial<RemoteLoad> = {}): RemoteLoad => ({
  stress: mpa(1),
  ratio: 0,
  angle: degrees(0),
  pressure: mpa(0),
  ...more,
});

const POINTS = [
  [1, 90, 'tangential', 3],
  [1, 0, 'tangential', -1],
  [2, 90, 'tangential', 1.21875],
  [3, 90, 'tangential', 1.07407407407],
  [2, 0, 'radial', 0.46875],
] as const;
const kirsch = POINTS.map(([r, theta, part, value], i) =>
  row(
    `SR-K${i + 1}`,
    `${part} stress over S beside a circular hole, r = ${r} R, ${theta}° from the load`,
    value,
    1e-9,
    'closed form',
    'Kirsch 1898, evaluated by hand',
    () => kirschPolar(mm(1), load(), mm(r), degrees(theta))[part],
  ),
);

const AXES = [
  [1, 1, 3],
  [2, 1, 5],
  [10, 1, 21],
  [1, 2, 2],
] as const;
const inglis = AXES.map(([a, b, kt], i) =>
  row(
    `SR-I${i + 1}`,
    `peak factor of an elliptical hole, A/B = ${a / b}`,
    kt,
    1e-12,
    'closed form',
    'Inglis 1913, 1 + 2A/B',
    () => inglisFactor(mm(a), mm(b), 0),
  ),
);

const BIAXIAL = [
  [-1, 4],
  [0.5, 2.5],
  [1, 2],
] as const;
const biaxial = BIAXIAL.map(([ratio, kt], i) =>
  row(
    `SR-B${i + 1}`,
    `peak factor of a circular hole at biaxial ratio ${ratio}, from the field at the edge`,
    kt,
    1e-12,
    'exact limit',
    'superposition of two uniaxial fields, 3 − λ',
    () => kirschField(mm(7), load({ ratio, angle: degrees(90) }))(7, 0, noStress()).yy,
  ),
);

/** An elliptical hole at a point off its axes, by the potentials of Inglis' problem. */
const ellipseAt = (across: number, along: number, part: 'xx' | 'yy' | 'xy') =>
  ellipseField({ across: mm(across), along: mm(along) }, load({ ratio: 0.3, angle: degrees(25) }))(
    3,
    2,
    noStress(),
  )[part];

const circle = kirschField(mm(2), load({ ratio: 0.3, angle: degrees(25) }))(3, 2, noStress());
const limits = (['xx', 'yy', 'xy'] as const).map((part, i) =>
  row(
    `SR-L${i + 1}`,
    `stress ${part} beside an ellipse of equal axes, biaxial at 25°`,
    circle[part],
    1e-12,
    'exact limit',
    'Kirsch’s field: the hole is the limit of the ellipse',
    () => ellipseAt(2, 2, part),
  ),
);

// integrals of q = R²/(R + x)² and its square over a ligament of one radius, worked out by hand
const LINE = [
  ['membrane', 1 + (0.5 * 1 * 0.5 + 1.5 * (7 / 24)), 'membrane'],
  [
    'bending',
    6 *
      (0.5 * (0.25 - (Math.log(2) - 0.5)) +
        1.5 * (7 / 48 - (0.5 * (1 - 1 / 4) - (1 / 3) * (1 - 1 / 8)))),
    'bending',
  ],
] as const;
const ligament = LINE.map(([name, value, part], i) =>
  row(
    `SR-F${i + 1}`,
    `${name} stress over S on a ligament of one radius beside a hole`,
    value,
    1e-10,
    'closed form',
    'integral of Kirsch’s stress across the ligament',
    () => fitThroughWall((x) => holeLigamentStress(mm(1), load(), mm(x)), 1)[part],
  ),
);

const others: readonly CheckRow[] = [
  row(
    'SR-1',
    'stress across the ligament over S, 1 mm from a hole of 20 mm radius, equibiaxial',
    1.91,
    0.002,
    'closed form',
    'Lamé: 1 + (R/r)², rounded',
    () => holeLigamentStress(mm(20), load({ ratio: 1 }), mm(1)),
  ),
  row(
    'SR-2',
    'relative stress gradient at the edge of a hole of radius 1',
    7 / 3,
    1e-6,
    'closed form',
    'difference of Kirsch’s stress at the edge and 1e-7 radii from it',
    () =>
      (1 - holeLigamentStress(mm(1), load(), mm(1e-7)) / holeLigamentStress(mm(1), load(), mm(0))) /
      1e-7,
    '1/mm',
  ),
  row(
    'SR-3',
    'relative stress gradient of a hole by its formula, λ = ½',
    1.8,
    1e-12,
    'closed form',
    'derivative of Kirsch’s stress by hand, (7 − 2.5)/2.5',
    () => holeGradient(mm(1), 0.5),
    '1/mm',
  ),
  row(
    'SR-4',
    'edge stress of a hole under pressure alone, over the pressure',
    1,
    1e-12,
    'exact limit',
    'Lamé, cylinder of infinite wall',
    () => holeEdgeStress(load({ stress: mpa(0), pressure: mpa(1) }), degrees(33)),
  ),
  row(
    'SR-5',
    'radial stress at the edge of the same',
    -1,
    1e-12,
    'exact limit',
    'equilibrium with the pressure',
    () => kirschPolar(mm(3), load({ stress: mpa(0), pressure: mpa(1) }), mm(3), degrees(33)).radial,
  ),
  row(
    'SR-6',
    'peak factor of a notch of the depth of its radius',
    3,
    1e-12,
    'exact limit',
    'the circular hole',
    () => notchFactor(mm(4), mm(4)),
  ),
  row(
    'SR-7',
    'peak factor of a hole under pure shear, −1',
    4,
    1e-12,
    'closed form',
    'Kirsch 1898: two uniaxial fields, 3 + 1',
    () => holePeakFactor(-1),
  ),
  row(
    'SR-8',
    'stress at the edge of an ellipse by its field, A/B = 4',
    9,
    1e-10,
    'closed form',
    'Inglis 1913, 1 + 2A/B',
    () =>
      ellipseField({ across: mm(4), along: mm(1) }, load({ angle: degrees(90) }))(4, 0, noStress())
        .yy,
  ),
];

export const STRESS_RAISER_CHECKS: readonly CheckRow[] = [
  ...kirsch,
  ...biaxial,
  ...inglis,
  ...limits,
  ...STRIP_FACTOR_CHECKS,
  ...ligament,
  ...others,
];
