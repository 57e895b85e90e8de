import { openingLevel, openShare } from '../growth/laws/closure';
import { ferriticAirScale } from '../growth/laws/ferritic-air';
import { waterTransition } from '../growth/laws/ferritic-water';
import { formanRate } from '../growth/laws/forman';
import { ratePerCycle } from '../growth/laws/rate-per-cycle';
import { walkerRange } from '../growth/laws/walker';
import { crackLaw } from '../materials/crack-law-library';
import { growthLaw } from '../materials/growth-laws';
import { convertParisCoefficient, ENGINE_PARIS_UNITS } from '../units/convert-paris';
import { toMPaSqrtMm } from '../units/convert';
import { MM_PER, MPA_SQRT_MM_PER } from '../units/exact-factors';
import type { CheckKind, CheckRow } from './check-row';
import { growthRow as row } from './growth-row';

const AIR = 'ASME XI A-4300 (from memory; exponent and form seen in a secondary source)';
const WATER = 'ASME XI A-4300(b)(2) (from memory; constants and transition check each other)';

/** A law of the library with ΔK in ksi·√in, in in/cycle as it is published. */
function inchesPerCycle(key: string, range: number, stressRatio: number, temperatureC = 20) {
  const law = crackLaw(key);
  if (!law) return Number.NaN;
  const rate = ratePerCycle(law, { temperatureC });
  return rate(toMPaSqrtMm(range, 'ksi·√in'), stressRatio) / MM_PER.in;
}

const REFERENCE_CURVES = [
  ['ferritic-air-code', 'air', 20, 0.1, 2.188107243802607e-6],
  ['ferritic-air-code', 'air', 20, 0.7, 4.615563092992771e-6],
  ['ferritic-water-code', 'water', 10, 0.1, 9.090759568964209e-7],
  ['ferritic-water-code', 'water', 30, 0.1, 7.668454065804031e-5],
  ['ferritic-water-code', 'water', 30, 0.7, 0.0001917113516451008],
] as const;
const reference = REFERENCE_CURVES.map(([key, medium, range, ratio, rate], i) =>
  row(
    `GK-${i + 1}`,
    `ferritic reference curve in ${medium}: da/dN at ΔK = ${range} ksi·√in, R = ${ratio}`,
    rate,
    'in/cycle',
    1e-9,
    'from memory',
    medium === 'air' ? AIR : WATER,
    () => inchesPerCycle(key, range, ratio),
  ),
);

const transitionAt = (ratio: number) => {
  const law = crackLaw('ferritic-water-code');
  return law?.form === 'asme ferritic water'
    ? waterTransition(law, ratio) / MPA_SQRT_MM_PER['ksi·√in']
    : Number.NaN;
};
const coefficientOf = (key: string) => {
  const law = crackLaw(key);
  return law?.form === 'asme ferritic air'
    ? convertParisCoefficient(law.coefficient, law.exponent, {
        from: ENGINE_PARIS_UNITS,
        to: { growth: 'mm', range: 'MPa·√m' },
      })
    : Number.NaN;
};
const stage = (key: string, which: 0 | 1) => growthLaw(key)?.stages[which];

/** Means at R ≥ 0.5, in the units of the engine. */
const MEANS: readonly (readonly [string, number, () => number | undefined])[] = [
  [
    'A of the upper stage, marine',
    5.67e-7,
    () => stage('steel-marine-free-high-mean', 1)?.coefficient,
  ],
  ['m of the lower stage, air', 5.1, () => stage('steel-air-high-mean', 0)?.exponent],
  ['m of the upper stage, air', 2.88, () => stage('steel-air-high-mean', 1)?.exponent],
  ['m of the lower stage, marine', 3.42, () => stage('steel-marine-free-high-mean', 0)?.exponent],
  ['m of the upper stage, marine', 1.11, () => stage('steel-marine-free-high-mean', 1)?.exponent],
];
const means = MEANS.map(([quantity, published, compute], i) =>
  row(
    `GM-${i + 1}`,
    `two-stage mean, R ≥ 0.5: ${quantity}`,
    published,
    '-',
    1e-9,
    'published table',
    'JCSS Probabilistic Model Code Part 3.12, Table 3.1',
    () => compute() ?? Number.NaN,
  ),
);

type Single = readonly [string, number, string, number, CheckKind, string, () => number];
const SINGLES: readonly Single[] = [
  [
    'ferritic reference curve in air: S at R = 0',
    1,
    '-',
    1e-3,
    'from memory',
    AIR,
    () => ferriticAirScale(0),
  ],
  [
    'ferritic reference curve in air: coefficient with MPa·√m',
    3.784545757811002e-9,
    'mm/cycle',
    1e-9,
    'closed form',
    'conversion of 1.99e-10 in/cycle with ksi·√in',
    () => coefficientOf('ferritic-air-code'),
  ],
  [
    'the same against the metric form of JSME (2.5 % more)',
    3.88e-9,
    'mm/cycle',
    0.03,
    'published table',
    'scripts quoting the JSME fitness-for-service code',
    () => coefficientOf('ferritic-air-code'),
  ],
  [
    'reference curve in water: transition at R = 0.1',
    17.74,
    'ksi·√in',
    2e-3,
    'from memory',
    WATER,
    () => transitionAt(0.1),
  ],
  [
    'reference curve in water: transition at R = 0.65',
    12.04,
    'ksi·√in',
    2e-3,
    'from memory',
    WATER,
    () => transitionAt(0.65),
  ],
  [
    'Walker: ΔK = 20, R = 0.5, C = 5e-9, m = 3, γ = 0.5',
    0.0001131370849898476,
    'per cycle',
    1e-9,
    'closed form',
    'C (ΔK/(1 − R)^(1 − γ))^m',
    () => 5e-9 * walkerRange(20, 0.5, 0.5) ** 3,
  ],
  [
    'Forman: ΔK = 20, R = 0.5, C = 1e-6, m = 3, Kc = 100',
    0.0002666666666666667,
    'per cycle',
    1e-9,
    'closed form',
    'C ΔK^m/((1 − R) Kc − ΔK)',
    () => formanRate({ coefficient: 1e-6, exponent: 3, toughnessMPaSqrtMm: 100 }, 20, 0.5),
  ],
  [
    'Elber: open share at R = 0.3',
    0.62,
    '-',
    1e-9,
    'from memory',
    'Elber 1971, 2024-T3 (from memory)',
    () => openShare(0.5, 0.4, 0.3),
  ],
  [
    'Newman: opening level at R = 0, α = 3, Smax/σ0 = 0.3',
    0.2453769751514493,
    '-',
    1e-9,
    'from memory',
    'Newman 1984 (from memory)',
    () => openingLevel(0, 3, 0.3),
  ],
  [
    'Newman: opening level at R = 1, α = 2',
    1,
    '-',
    1e-9,
    'exact limit',
    'the crack is never closed',
    () => openingLevel(1, 2, 0.3),
  ],
];
const singles = SINGLES.map(([quantity, published, unit, tolerance, kind, source, compute], i) =>
  row(`GF-${i + 1}`, quantity, published, unit, tolerance, kind, source, compute),
);

export const GROWTH_FORM_CHECKS: readonly CheckRow[] = [...means, ...reference, ...singles];
