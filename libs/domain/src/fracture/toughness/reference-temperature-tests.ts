import {
  outOfBounds,
  refused,
  type NumberRule,
  type Refusal,
  type Refused,
} from '../../geometry/refusal';
import { capacityLimit } from '../../materials/toughness/from-fracture-test';
import {
  masterCurveMedianMPaSqrtM,
  MASTER_CURVE_SPAN_C,
  ONE_INCH_MM,
  toFrontLengthMPaSqrtM,
} from '../../materials/toughness/master-curve';
import {
  likelihoodSlope,
  medianOfScale,
  scaleOfTests,
  t0Deviation,
  t0OfScale,
  testWeight,
  type OneInchTest,
} from '../../materials/toughness/t0-from-tests';
import { findRoot } from '../../numerics/find-root';
import { toMPaSqrtM } from '../../units/convert';
import { rule } from './toughness-rules';

/** One fracture toughness test of the transition. */
export interface ToughnessTest {
  readonly temperatureC: number;
  /** KJc as measured, or the last value reached without cleavage [MPa·√m]. */
  readonly kJcMPaSqrtM: number;
  /** Length of the crack front [mm]. */
  readonly thicknessMm: number;
  /** The specimen did not cleave. */
  readonly censored: boolean;
  /** Ligament and properties the capacity is judged by; null where the value is known to be inside. */
  readonly capacity: {
    readonly ligamentMm: number;
    readonly yieldMPa: number;
    readonly youngsModulusMPa: number;
    readonly poissonsRatio: number;
  } | null;
}

/** A reference temperature from tests. */
export interface ReferenceTemperature {
  readonly status: 'found';
  readonly t0C: number;
  /** Standard deviation of T0 [°C]. */
  readonly deviationC: number;
  readonly method: 'one temperature' | 'maximum likelihood';
  readonly source: string;
  /** Tests as used, for a front of 25.4 mm. */
  readonly used: readonly OneInchTest[];
  /** Tests left out because they are more than 50 °C from T0. */
  readonly leftOut: readonly OneInchTest[];
  readonly uncensored: number;
  /** Sum of the weights of the tests; at least 1. */
  readonly weight: number;
}

const SOURCE = 'ASTM E1921 (from memory; one-temperature form seen in scripts that quote it)';
/** Lowest median tests at one temperature may have [MPa·√m] (ASTM E1921, from memory). */
const LEAST_MEDIAN = 58;
/** How far from the tests a T0 is searched for [°C]. */
const SEARCH_C = 300;
const SETTLED_AFTER = 20;

/** T0 of tests, by the form for one temperature where they share one, else by maximum likelihood. */
export function referenceTemperature(
  tests: readonly ToughnessTest[],
): ReferenceTemperature | Refused {
  const refusals = outOfBounds(tests.flatMap(rulesOf));
  if (refusals.length > 0) return refused(...refusals);
  const adjusted = tests.map(toOneInch);
  const [first] = adjusted;
  if (!first || uncensoredOf(adjusted) === 0) return refused(tooFew(0));
  const together = adjusted.every(({ temperatureC }) => temperatureC === first.temperatureC);
  return together ? atOneTemperature(adjusted, first.temperatureC) : byLikelihood(adjusted);
}

/** A test for a front of 25.4 mm; beyond its capacity it is censored there. */
export function toOneInch(test: ToughnessTest): OneInchTest {
  const { temperatureC, kJcMPaSqrtM, thicknessMm, censored, capacity } = test;
  const limit = capacity
    ? toMPaSqrtM(
        capacityLimit(
          capacity.youngsModulusMPa,
          capacity.ligamentMm,
          capacity.yieldMPa,
          capacity.poissonsRatio,
        ),
      )
    : Infinity;
  return {
    temperatureC,
    kMPaSqrtM: toFrontLengthMPaSqrtM(Math.min(kJcMPaSqrtM, limit), thicknessMm, ONE_INCH_MM),
    censored: censored || kJcMPaSqrtM > limit,
  };
}

const uncensoredOf = (tests: readonly OneInchTest[]): number =>
  tests.filter(({ censored }) => !censored).length;

function atOneTemperature(
  used: readonly OneInchTest[],
  temperatureC: number,
): ReferenceTemperature | Refused {
  const values = used.map(({ kMPaSqrtM }) => kMPaSqrtM);
  const scale = scaleOfTests(values, uncensoredOf(used));
  const median = medianOfScale(scale);
  if (median < LEAST_MEDIAN) return refused(tooBrittle(median));
  const t0C = t0OfScale(temperatureC, scale);
  return rated({ t0C, median, used, leftOut: [], method: 'one temperature' });
}

/** Maximum likelihood, repeated with the tests within 50 °C of the last T0 until these stay the same. */
function byLikelihood(all: readonly OneInchTest[]): ReferenceTemperature | Refused {
  let used = all;
  for (let i = 0; i < SETTLED_AFTER; i++) {
    const t0C = mostLikely(used);
    if (t0C === null) return refused(NOTHING_LIKELY);
    const near = all.filter(
      ({ temperatureC }) => Math.abs(temperatureC - t0C) <= MASTER_CURVE_SPAN_C,
    );
    if (uncensoredOf(near) === 0) return refused(tooFew(0));
    if (near.length === used.length && near.every((test, at) => test === used[at])) {
      const leftOut = all.filter((test) => !near.includes(test));
      return rated({
        t0C,
        median: meanMedian(near, t0C),
        used,
        leftOut,
        method: 'maximum likelihood',
      });
    }
    used = near;
  }
  return refused(NOTHING_LIKELY);
}

function mostLikely(tests: readonly OneInchTest[]): number | null {
  const temperatures = tests.map(({ temperatureC }) => temperatureC);
  const [low, high] = [Math.min(...temperatures) - SEARCH_C, Math.max(...temperatures) + SEARCH_C];
  const root = findRoot((t0) => likelihoodSlope(tests, t0), low, high, { tolerance: 1e-10 });
  return root.status === 'found' ? root.x : null;
}

const meanMedian = (tests: readonly OneInchTest[], t0: number): number =>
  tests
    .filter(({ censored }) => !censored)
    .reduce((sum, { temperatureC }) => sum + masterCurveMedianMPaSqrtM(temperatureC, t0), 0) /
  uncensoredOf(tests);

interface Rating extends Pick<ReferenceTemperature, 't0C' | 'used' | 'leftOut' | 'method'> {
  readonly median: number;
}

function rated({ median, ...found }: Rating): ReferenceTemperature | Refused {
  const { used, t0C } = found;
  const weight = used
    .filter(({ censored }) => !censored)
    .reduce((sum, { temperatureC }) => sum + testWeight(temperatureC - t0C), 0);
  // six tests of a sixth each may fall short of 1 by a rounding
  if (weight < 1 - 1e-12) return refused(tooFew(weight));
  const uncensored = uncensoredOf(used);
  const deviationC = t0Deviation(median, uncensored);
  return { status: 'found', ...found, deviationC, source: SOURCE, uncensored, weight };
}

function rulesOf(test: ToughnessTest, i: number): readonly NumberRule[] {
  const { temperatureC, kJcMPaSqrtM, thicknessMm, capacity } = test;
  return [
    rule('temperature', `tests.${i}.temperatureC`, temperatureC),
    // the Weibull form starts at 20
    { ...rule('toughness', `tests.${i}.kJcMPaSqrtM`, kJcMPaSqrtM), min: 20, above: true },
    rule('thickness', `tests.${i}.thicknessMm`, thicknessMm),
    ...(capacity
      ? [
          rule('length', `tests.${i}.capacity.ligamentMm`, capacity.ligamentMm),
          rule('strength', `tests.${i}.capacity.yieldMPa`, capacity.yieldMPa),
          rule('modulus', `tests.${i}.capacity.youngsModulusMPa`, capacity.youngsModulusMPa),
          rule('poisson', `tests.${i}.capacity.poissonsRatio`, capacity.poissonsRatio),
        ]
      : []),
  ];
}

const tooFew = (weight: number): Refusal => ({
  input: 'tests',
  limit: 'Σ of the weights ≥ 1: six uncensored tests near T0, more below it',
  value: weight,
  message: `The uncensored tests within 50 °C of T0 count ${weight.toFixed(2)}; a T0 needs 1.`,
  instead: 'Test more specimens, nearer to T0.',
});

const tooBrittle = (median: number): Refusal => ({
  input: 'tests',
  limit: `median of at least ${LEAST_MEDIAN} MPa·√m`,
  value: median,
  message: `The median is ${median.toFixed(1)} MPa·√m: the tests are more than 50 °C below T0.`,
  instead: 'Test at a higher temperature.',
});

const NOTHING_LIKELY: Refusal = {
  input: 'tests',
  limit: 'a T0 within 300 °C of the tests, with the same tests within 50 °C of it',
  value: null,
  message: 'No T0 fits these tests: the selection of tests about it does not settle.',
  instead: 'Check the tests, or test at more temperatures about the expected T0.',
};
