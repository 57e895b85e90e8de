import { interaction } from '../fracture/fad/interaction';
import { lrMax, optionOne, type DiagramMaterial } from '../fracture/fad/option-one';
import { reserveOnLoad } from '../fracture/fad/reserve-on-load';
import { largestAcceptable } from '../fracture/limiting-flaw/acceptance-search';
import { cylinderAxialApiReference } from '../fracture/reference-stress/cylinder-axial-api-reference';
import { PLATE_SURFACE_K } from '../fracture/stress-intensity/plate-surface-k';
import { ratesPerYear } from '../growth/growth-rates';
import { integrateGrowth } from '../growth/integrate-growth';
import { growthLaw } from '../materials/growth-laws';
import { vesselInternalInterval } from '../scheduling/interval-rules';
import { mpa } from '../units/quantity';
import type { CheckRow } from './check-row';
import { crackOf, kOf } from './crack-of';

// a vessel wall with an axial flaw, K of the plate and the API reference stress: two methods each
const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const SIZE = { a: 6.316, c: 17.4675 };
const wall = (a: number, c: number) => ({ a, c, t: 25, W: 4000 });
const k = (a: number, c: number, angle: number, stress: number) =>
  kOf(PLATE_SURFACE_K, wall(a, c), angle, stress);
const lrOf = (a: number, c: number) =>
  cylinderAxialApiReference(crackOf({ a, c, t: 25, Ri: 750 }), mpa(200), mpa(0)) / STEEL.yieldMPa;

function margin(a: number, c: number, kmat: number, factor: number): number {
  const lr = factor * lrOf(a, c);
  const kr = [90, 0].map((angle) => {
    const [kp, ks] = [factor * k(a, c, angle, 200), k(a, c, angle, 70)];
    return (kp + ks) / (kmat * Math.sqrt(1000)) + interaction(kp, ks, lr);
  });
  return Math.min(optionOne(lr, STEEL) - Math.max(...kr), lrMax(STEEL) - lr);
}

function life(kmat: number, cyclesPerYear: number) {
  const law = growthLaw('steel-air-high-upper');
  if (!law) return { years: Number.NaN, a: Number.NaN, c: Number.NaN };
  let [depth, half] = [SIZE.a, SIZE.c];
  const blocks = [{ membraneRangeMPa: 200, bendingRangeMPa: 0, cyclesPerYear }];
  const perYear = ratesPerYear(
    { fatigue: { law, blocks }, stressCorrosion: null },
    { deepest: (s) => k(depth, half, 90, s), end: (s) => k(depth, half, 0, s) },
  );
  const run = integrateGrowth(
    SIZE,
    (a, c, into) => {
      [depth, half] = [a, c];
      perYear(into);
    },
    [
      { key: 'diagram', margin: (a, c) => margin(a, c, kmat, 1) },
      { key: 'depth', margin: (a) => 0.8 - a / 25 },
    ],
    { horizonYears: 1000, tolerance: 1e-8 },
  );
  return run.states[run.states.length - 1] ?? { years: Number.NaN, a: Number.NaN, c: Number.NaN };
}

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  compute: () => number,
): CheckRow => ({
  id,
  group: 'End to end',
  quantity,
  published,
  unit,
  tolerance,
  kind: 'independent computation',
  source: 'the whole case computed with a separate program, two methods each',
  compute,
});

const inMetres = Math.sqrt(1000);
const reserve = (kmat: number) =>
  reserveOnLoad((f) => margin(SIZE.a, SIZE.c, kmat, f), lrMax(STEEL) / lrOf(SIZE.a, SIZE.c));

const krDeepest = (kmat: number) => {
  const [kp, ks] = [k(SIZE.a, SIZE.c, 90, 200), k(SIZE.a, SIZE.c, 90, 70)];
  return (kp + ks) / (kmat * inMetres) + interaction(kp, ks, lrOf(SIZE.a, SIZE.c));
};

function interval(kmat: number, cyclesPerYear: number): number {
  const outcome = vesselInternalInterval(life(kmat, cyclesPerYear).years);
  return outcome.status === 'interval' ? outcome.years : Number.NaN;
}

function largestFactor(kmat: number): number {
  const found = largestAcceptable({
    input: 'stress.primaryMembraneMPa',
    name: 'load factor',
    unit: '',
    least: 0,
    most: 5,
    margin: (factor) => margin(SIZE.a, SIZE.c, kmat, factor),
  });
  return found.status === 'found' ? found.value : Number.NaN;
}

// a pipe wall 15 mm thick, 4 mm deep, growing 0.5 mm a year into the wall and 1.5 at each end
function yearsToDeepest(): number {
  const perYear = ratesPerYear(
    { fatigue: null, stressCorrosion: { depthRateMmPerYear: 0.5, endRateMmPerYear: 1.5 } },
    { deepest: () => 0, end: () => 0 },
  );
  const run = integrateGrowth(
    { a: 4, c: (150 * Math.PI * 40) / 180 },
    (_a, _c, into) => perYear(into),
    [{ key: 'depth', margin: (a) => 0.8 - a / 15 }],
    { horizonYears: 100, tolerance: 1e-9 },
  );
  return run.states[run.states.length - 1]?.years ?? Number.NaN;
}

export const END_TO_END_CHECKS: readonly CheckRow[] = [
  row('E1-1', 'load ratio', 0.578733896814528, '', 1e-9, () => lrOf(SIZE.a, SIZE.c)),
  row(
    'E1-2',
    'KIp at the deepest point',
    29.01582941630426,
    'MPa·√m',
    1e-9,
    () => k(SIZE.a, SIZE.c, 90, 200) / inMetres,
  ),
  row(
    'E1-3',
    'KIp at the surface',
    19.58235405602737,
    'MPa·√m',
    1e-9,
    () => k(SIZE.a, SIZE.c, 0, 200) / inMetres,
  ),
  row('E1-4', 'reserve on load, Kmat 120', 1.75834, '', 1e-5, () => reserve(120)),
  row(
    'E1-5',
    'half length when a/t = 0.8 ends the life',
    28.80517812781111,
    'mm',
    1e-5,
    () => life(120, 300).c,
  ),
  row(
    'E1-6',
    'remaining life, 300 cycles a year',
    52.18824032324065,
    'years',
    1e-5,
    () => life(120, 300).years,
  ),
  row('E1-7', 'depth there, the share of the wall governs', 20, 'mm', 1e-5, () => life(120, 300).a),
  row(
    'E1-8',
    'cycles to the limit',
    15656.47209697219,
    'cycles',
    1e-5,
    () => 300 * life(120, 300).years,
  ),
  row('E1-9', 'interval: half the life, at most 10 years', 10, 'years', 1e-5, () =>
    interval(120, 300),
  ),
  row('E2-0', 'Kr at the deepest point with interaction', 0.7438992381251965, '', 1e-9, () =>
    krDeepest(55),
  ),
  row('E2-1', 'reserve on load, Kmat 55', 1.209088762439486, '', 1e-8, () => reserve(55)),
  row(
    'E2-2',
    'depth when the diagram ends the life',
    11.23206220808697,
    'mm',
    1e-5,
    () => life(55, 1500).a,
  ),
  row(
    'E2-3',
    'remaining life, 1500 cycles a year',
    5.434658459859913,
    'years',
    1e-5,
    () => life(55, 1500).years,
  ),
  row('E2-4', 'half length there', 19.9438, 'mm', 1e-5, () => life(55, 1500).c),
  row(
    'E2-5',
    'cycles to the limit',
    8151.987689789869,
    'cycles',
    1e-5,
    () => 1500 * life(55, 1500).years,
  ),
  row('E2-6', 'interval: half the life', 2.717329229929956, 'years', 1e-5, () =>
    interval(55, 1500),
  ),
  row('E2-7', 'largest load factor by bracketed search', 1.209088762439486, '', 1e-8, () =>
    largestFactor(55),
  ),
  row('E4-1', 'pipe under stress corrosion: time to a/t = 0.8', 16, 'years', 1e-9, yearsToDeepest),
];
