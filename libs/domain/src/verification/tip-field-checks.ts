import { ellipseField } from '../fracture/stress-raisers/ellipse-field';
import type { PlaneCondition, PlaneStress } from '../fracture/stress-state';
import { noStress } from '../fracture/stress-state';
import { effectiveLength } from '../fracture/tip-field/effective-length';
import { energyRelease, planeModulus } from '../fracture/tip-field/energy-release';
import { nearTipStress } from '../fracture/tip-field/near-tip-field';
import { nearTipReach, nearTipShareAhead } from '../fracture/tip-field/near-tip-ratio';
import { leastElasticSize, plasticRadius } from '../fracture/tip-field/plastic-zone';
import { pulledCrackK, westergaardField } from '../fracture/tip-field/westergaard-field';
import { openingCoefficient, openingTerm } from '../fracture/tip-field/williams-series';
import { toMPaSqrtMm } from '../units/convert';
import { degrees, mm, mpa, mpaSqrtMm } from '../units/quantity';
import type { CheckKind, CheckRow } from './check-row';

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  kind: CheckKind,
  source: string,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Crack-tip field',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

type Part = keyof PlaneStress;

const BIPOLAR = 'the same field in bipolar coordinates, by a separate program in high precision';
const POINTS: readonly (readonly [k: number, x: number, y: number, part: Part, value: number])[] = [
  [1, 1.5, 0, 'xx', 1.3416407865],
  [1, 1.5, 0, 'yy', 1.3416407865],
  [0, 2, 0.5, 'yy', 1.17982616292],
  [1, 0, 1, 'xx', 1.06066017178],
  [1, 0, 1, 'yy', 0.353553390593],
  [0.5, -1.2, 0.7, 'xx', 0.315335502336],
  [0.5, -1.2, 0.7, 'yy', 1.24893256597],
  [0.5, -1.2, 0.7, 'xy', 0.237067906454],
];
const crackAt = (ratio: number, x: number, y: number, part: Part) =>
  westergaardField({ halfLength: mm(1), stress: mpa(1), ratio })(x, y, noStress())[part];

const exact = POINTS.map(([k, x, y, part, value], i) =>
  row(
    `TF-X${i + 1}`,
    `stress ${part} over S at (${x}, ${y}) a, k = ${k}`,
    value,
    '',
    1e-9,
    'independent computation',
    BIPOLAR,
    () => crackAt(k, x, y, part),
  ),
);

const flat = (['xx', 'yy', 'xy'] as const).map((part, i) =>
  row(
    `TF-E${i + 1}`,
    `stress ${part} beside an ellipse without height at (−1.2, 0.7) a, k = ½`,
    crackAt(0.5, -1.2, 0.7, part),
    '',
    1e-11,
    'exact limit',
    'Westergaard’s field: the crack is the limit of the ellipse',
    () => {
      const load = { stress: mpa(1), ratio: 0.5, angle: degrees(90), pressure: mpa(0) };
      return ellipseField({ across: mm(1), along: mm(0) }, load)(-1.2, 0.7, noStress())[part];
    },
  ),
);

const opening = (k: number, r: number, theta: number) =>
  nearTipStress(
    { opening: mpaSqrtMm(k), sliding: mpaSqrtMm(0), along: mpa(0) },
    mm(r),
    degrees(theta),
  ).yy;
const tip: readonly CheckRow[] = [
  row(
    'TF-N1',
    'near-tip σyy for K = 1 at r = 0.01, 60°',
    5.18241224207,
    'MPa',
    1e-9,
    'closed form',
    'Irwin 1957, Williams 1957, evaluated separately',
    () => opening(1, 0.01, 60),
  ),
  row(
    'TF-N2',
    'near-tip σyy for K = 1 at r = 0.01, 120°',
    1.99471140201,
    'MPa',
    1e-9,
    'closed form',
    'Irwin 1957, Williams 1957, evaluated separately',
    () => opening(1, 0.01, 120),
  ),
  row(
    'TF-N3',
    'near-tip σyy over S ahead at r = a/10 000',
    70.715981309,
    '',
    2e-4,
    'exact limit',
    'Westergaard’s exact stress at the same point',
    () => opening(Math.sqrt(Math.PI), 1e-4, 0),
  ),
  row(
    'TF-N4',
    'exact over near-tip stress at r = a/20',
    1.05 / Math.sqrt(1.025),
    '',
    1e-12,
    'closed form',
    '(1 + r/a)/√(1 + r/2a)',
    () => crackAt(1, 1.05, 0, 'yy') / opening(Math.sqrt(Math.PI), 0.05, 0),
  ),
  row(
    'TF-N5',
    'near-tip over exact stress at the distance where 5 % are missing',
    1 / 1.05,
    '',
    1e-12,
    'closed form',
    'the definition of that distance',
    () => nearTipShareAhead(nearTipReach(mm(1), 0.05)),
  ),
  row(
    'TF-N6',
    'twelve terms of the series at r = a/2, 70°, σyy over S, k = 0',
    crackAt(
      0,
      1 + 0.5 * Math.cos((70 * Math.PI) / 180),
      0.5 * Math.sin((70 * Math.PI) / 180),
      'yy',
    ),
    '',
    2e-4,
    'exact limit',
    'Westergaard’s exact stress at the same point',
    () => seriesStress(12, 0.5, (70 * Math.PI) / 180),
  ),
];

function seriesStress(terms: number, r: number, theta: number): number {
  const crack = { halfLength: mm(1), stress: mpa(1), ratio: 0 };
  let sum = 0;
  for (let n = 1; n <= terms; n++)
    sum += openingCoefficient(crack, n) * openingTerm(n, r, theta).yy;
  return sum;
}

const K50 = toMPaSqrtMm(50, 'MPa·√m');
const CONDITIONS: readonly (readonly [
  condition: PlaneCondition,
  modulus: number,
  energy: number,
  radius: number,
])[] = [
  ['plane strain', 219780.21978, 11.375, 0.82893199527],
  ['plane stress', 200000, 12.5, 2.48679598581],
];
const energy = CONDITIONS.flatMap(([condition, modulus, release, radius], i) => {
  const elastic = { youngsModulus: mpa(200_000), poisson: 0.3, condition };
  return [
    row(
      `TF-M${i + 1}`,
      `modulus in ${condition}, E 200 GPa, ν 0.3`,
      modulus,
      'MPa',
      1e-9,
      'closed form',
      'Hooke’s law',
      () => planeModulus(elastic),
    ),
    row(
      `TF-G${i + 1}`,
      `energy release rate of K = 50 MPa·√m in ${condition}`,
      release,
      'kJ/m²',
      1e-9,
      'closed form',
      'Irwin 1957, K²/E′',
      () => energyRelease(elastic, K50),
    ),
    row(
      `TF-P${i + 1}`,
      `plastic radius of K = 50 MPa·√m, yield 400 MPa, ${condition}`,
      radius,
      'mm',
      1e-9,
      'closed form',
      'Irwin’s first-order radius',
      () => plasticRadius(K50, mpa(400), condition),
    ),
  ];
});

const effective = (): number => {
  const answer = effectiveLength({
    lengthMm: 10,
    longestMm: 100,
    yieldMPa: 400,
    condition: 'plane stress',
    intensityAt: (a) => pulledCrackK({ halfLength: mm(a), stress: mpa(200), ratio: 0 }),
  });
  return answer.status === 'found' ? answer.lengthMm : Number.NaN;
};

const others: readonly CheckRow[] = [
  row(
    'TF-1',
    'energy release rate of K = 6.646 MPa·√m, E 210 GPa, ν 0.3, plane strain',
    0.1914,
    'kJ/m²',
    5e-4,
    'published table',
    'public validation manual of a finite-element program, edge-crack test V3.02.111',
    () =>
      energyRelease(
        { youngsModulus: mpa(210_000), poisson: 0.3, condition: 'plane strain' },
        toMPaSqrtMm(6.646, 'MPa·√m'),
      ),
  ),
  row(
    'TF-2',
    'crack of half length 10 mm with its plastic zone, half of yield, plane stress',
    10 / (1 - 0.125),
    'mm',
    1e-9,
    'closed form',
    'a/(1 − (σ/σy)²/2), solved by hand for the wide plate',
    effective,
  ),
  row(
    'TF-3',
    'size for small-scale yielding at K = 42.8 MPa·√m, yield 286 MPa',
    2.5 * (42.8 / 286) ** 2 * 1000,
    'mm',
    1e-12,
    'closed form',
    'ASTM E399, 2.5 (K/σy)² in metres',
    () => leastElasticSize(toMPaSqrtMm(42.8, 'MPa·√m'), mpa(286)),
  ),
];

export const TIP_FIELD_CHECKS: readonly CheckRow[] = [
  ...exact,
  ...flat,
  ...tip,
  ...energy,
  ...others,
];
