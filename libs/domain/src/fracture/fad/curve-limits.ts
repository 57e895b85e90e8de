import type { Refusal } from '../../geometry/refusal';

/** One point of a tensile test. */
export interface CurvePoint {
  readonly strain: number;
  readonly stressMPa: number;
}

/** A stress–strain curve as a user enters it. */
export interface CurveInput {
  readonly points: readonly CurvePoint[];
  readonly values: 'engineering' | 'true';
  readonly yieldMPa: number;
  readonly youngsModulusMPa: number;
}

/** One point in true values. */
export interface TruePoint {
  readonly strain: number;
  readonly stress: number;
}

/** What a curve must be for Option 2, as data. */
export interface CurveLimit {
  readonly name: string;
  readonly text: string;
  readonly min: number;
  readonly max: number;
  readonly measure: (points: readonly TruePoint[], input: CurveInput) => number;
  readonly source: string;
  readonly instead: string;
}

const PRACTICE = 'common practice';
const STANDARD = 'BS 7910:2013 7.3.4 (from memory)';
const between = (
  points: readonly TruePoint[],
  { yieldMPa }: CurveInput,
  from: number,
  to: number,
) => points.filter(({ stress }) => stress >= from * yieldMPa && stress <= to * yieldMPa).length;

/** Least of the steps from one point to the next. */
const leastStep = (points: readonly TruePoint[], of: (point: TruePoint) => number): number =>
  points.reduce((least, point, i) => {
    const before = points[i - 1];
    return before ? Math.min(least, of(point) - of(before)) : least;
  }, Infinity);

/** The limits of a curve, in the order they are told. */
export const CURVE_LIMITS: readonly CurveLimit[] = [
  {
    name: 'Number of points',
    text: 'at least 8 points beside the origin',
    min: 8,
    max: Infinity,
    measure: (points) => points.length,
    source: PRACTICE,
    instead: 'Read more points from the test record, or use Option 1.',
  },
  {
    name: 'Least step of strain',
    text: 'strain that increases from point to point',
    min: Number.MIN_VALUE,
    max: Infinity,
    measure: (points) => leastStep(points, ({ strain }) => strain),
    source: PRACTICE,
    instead: 'Sort the points by strain and leave out repeated ones.',
  },
  {
    name: 'Least step of true stress',
    text: 'true stress that does not fall',
    min: 0,
    max: Infinity,
    measure: (points) => leastStep(points, ({ stress }) => stress),
    source: PRACTICE,
    instead: 'End the curve where necking starts; draw a yield drop as its lower plateau.',
  },
  {
    name: 'E ε/σ of the first point',
    text: '0.95 ≤ E ε/σ ≤ 1.05 at the first point',
    min: 0.95,
    max: 1.05,
    measure: ([first], { youngsModulusMPa }) =>
      first ? (youngsModulusMPa * first.strain) / first.stress : Number.NaN,
    source: PRACTICE,
    instead: 'Start on the elastic line; give strain in mm/mm, not in %, and stress in MPa.',
  },
  {
    name: 'Stress of the first point over σY',
    text: 'a first point at no more than 0.7 σY',
    min: 0,
    max: 0.7,
    measure: ([first], { yieldMPa }) => (first ? first.stress / yieldMPa : Number.NaN),
    source: STANDARD,
    instead: 'Add points of the elastic part.',
  },
  {
    name: 'Points from 0.7 to 1.2 σY',
    text: 'at least 5 points from 0.7 to 1.2 σY',
    min: 5,
    max: Infinity,
    measure: (points, input) => between(points, input, 0.7, 1.2),
    source: `${STANDARD}: it names 0.7, 0.8, 0.98, 1, 1.02, 1.1 and 1.2 σY`,
    instead: 'Add points about yield, where the diagram bends.',
  },
  {
    name: 'Stress of the last point over σY',
    text: 'a last point at σY or above',
    min: 1,
    max: Infinity,
    measure: (points, { yieldMPa }) => (points.at(-1)?.stress ?? Number.NaN) / yieldMPa,
    source: PRACTICE,
    instead: 'Give the curve to the start of necking, or use Option 1.',
  },
];

/** Why the points make no curve. */
export function brokenCurveLimits(
  input: CurveInput,
  points: readonly TruePoint[],
): readonly Refusal[] {
  const numbers = badNumbers(input);
  if (numbers.length > 0) return numbers;
  return CURVE_LIMITS.flatMap(({ name, text, min, max, measure, instead }) => {
    const value = measure(points, input);
    if (value >= min && value <= max) return [];
    const shown = Number.isFinite(value) ? value : String(value);
    const message = `${name} is ${shown}; Option 2 needs ${text}.`;
    return [{ input: 'material.stressStrainCurve', limit: text, value: shown, message, instead }];
  });
}

function badNumbers({ points, yieldMPa, youngsModulusMPa }: CurveInput): readonly Refusal[] {
  const checks = [
    ['material.yieldMPa', 'Yield strength', 'above 0 MPa', yieldMPa, yieldMPa > 0],
    [
      'material.youngsModulusMPa',
      'Young’s modulus',
      'above 0 MPa',
      youngsModulusMPa,
      youngsModulusMPa > 0,
    ],
    ...points.flatMap(
      ({ strain, stressMPa }, i) =>
        [
          [
            `material.stressStrainCurve.${i}.strain`,
            'Strain',
            'from 0 to 1',
            strain,
            strain >= 0 && strain <= 1,
          ],
          [
            `material.stressStrainCurve.${i}.stressMPa`,
            'Stress',
            'at least 0 MPa',
            stressMPa,
            stressMPa >= 0,
          ],
        ] as const,
    ),
  ] as const;
  return checks
    .filter(([, , , value, met]) => !met || !Number.isFinite(value))
    .map(([input, name, limit, value]) => ({
      input,
      limit,
      value: Number.isFinite(value) ? value : String(value),
      message: `${name} is ${value}; it must be ${limit}.`,
      instead: 'Give strain as mm/mm and stress in MPa.',
    }));
}
