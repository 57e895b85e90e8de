import { corrosionLife, corrosionRate, type WallReading } from '../growth/with-time/corrosion-life';
import { fromMm, toMm } from '../units/convert';
import type { LengthUnit } from '../units/exact-factors';
import { mm } from '../units/quantity';
import type { CheckRow } from './check-row';
import { exampleRows, type Example } from './growth-row';

const CORROSION = 'The Inspector’s Most Important Calculations (study guide), answer key';

const readings = (unit: LengthUnit, ...values: readonly (readonly [number, number])[]) =>
  values.map(([years, wall]): WallReading => ({ years, wallMm: toMm(wall, unit) }));
function rate(
  unit: LengthUnit,
  which: 'shortTermMmPerYear' | 'longTermMmPerYear' | 'governingMmPerYear',
  ...values: readonly (readonly [number, number])[]
): number {
  const outcome = corrosionRate(readings(unit, ...values));
  return outcome.status === 'found' ? fromMm(mm(outcome[which]), unit) : Number.NaN;
}
function life(wall: number, required: number, perYear: number): number {
  const outcome = corrosionLife(toMm(wall, 'in'), toMm(required, 'in'), toMm(perYear, 'in'));
  return outcome.status === 'found' ? outcome.years : Number.NaN;
}
const THREE = [
  [1990, 0.75],
  [1997, 0.742],
  [2003, 0.718],
] as const;
const corrosion: readonly Example[] = [
  [
    'corrosion rate: 0.75 to 0.675 in in 15 years',
    0.005,
    'in/year',
    1e-9,
    `${CORROSION}, ex. 2`,
    () => rate('in', 'governingMmPerYear', [0, 0.75], [15, 0.675]),
  ],
  [
    'corrosion rate: 480 to 410 mil in 22 years',
    3.2,
    'mil/year',
    0.01,
    `${CORROSION}, ex. 3`,
    () => rate('mil', 'governingMmPerYear', [0, 480], [22, 410]),
  ],
  [
    'corrosion rate: 0.565 to 0.521 in in 53 months',
    0.01,
    'in/year',
    5e-3,
    `${CORROSION}, ex. 5`,
    () => rate('in', 'governingMmPerYear', [0, 0.565], [53 / 12, 0.521]),
  ],
  [
    'corrosion life: 0.198 in, 0.15 in required, 0.007 in/year',
    6.9,
    'years',
    7e-3,
    `${CORROSION}, ex. 6`,
    () => life(0.198, 0.15, 0.007),
  ],
  [
    'corrosion life: 0.211 in, 0.15 in required, 0.003 in/year',
    20.3,
    'years',
    3e-3,
    `${CORROSION}, ex. 7`,
    () => life(0.211, 0.15, 0.003),
  ],
  [
    'short-term corrosion rate of three readings',
    0.004,
    'in/year',
    1e-9,
    `${CORROSION}, ex. 10`,
    () => rate('in', 'shortTermMmPerYear', ...THREE),
  ],
  [
    'long-term corrosion rate of three readings',
    0.002461538461538462,
    'in/year',
    1e-9,
    `${CORROSION}, ex. 10`,
    () => rate('in', 'longTermMmPerYear', ...THREE),
  ],
  [
    'governing corrosion rate of three readings',
    0.004,
    'in/year',
    1e-9,
    'the greater of the two, as API 570 (secondary source)',
    () => rate('in', 'governingMmPerYear', ...THREE),
  ],
];

export const CORROSION_EXAMPLE_CHECKS: readonly CheckRow[] = exampleRows('GX', corrosion);
