import { toughnessAt } from '@ligament/domain/fracture/toughness/find-toughness';
import { referenceTemperature } from '@ligament/domain/fracture/toughness/reference-temperature-tests';
import {
  type ToughnessResult,
  type ToughnessStep,
  weakestOrigin,
} from '@ligament/domain/fracture/toughness/toughness-result';
import type { Refusal, Refused } from '@ligament/domain/geometry/refusal';
import type { Given } from '@ligament/domain/units/provenance';
import { basisOf, masterBasis, testsOf } from './evidence-basis';
import { type Evidence, numberOf } from './evidence';
import { kindWords, wordsOf } from './evidence-kinds';

/** Toughness at a temperature from what was entered, with the weakest origin of all that it rests on. */
export function judgeEvidence(evidence: Evidence, temperatureC: number): ToughnessResult {
  const result = read(evidence, temperatureC);
  return result.status === 'found'
    ? { ...result, provenance: weakestOrigin(originsOf(evidence)) }
    : result;
}

/** Everything that stands against a value at once, also behind a temperature that is not entered yet. */
export function refusalsOf(evidence: Evidence, temperatureC: number): readonly Refusal[] {
  const result = judgeEvidence(evidence, temperatureC);
  if (result.status === 'found') return [];
  const tested = numberOf(evidence, 'testTemperatureC');
  const testTemperatureC = { ...tested, value: orZero(tested.value) };
  const entered = { ...evidence, numbers: { ...evidence.numbers, testTemperatureC } };
  const rest = judgeEvidence(entered, orZero(temperatureC));
  const said = new Set(['temperatureC', ...result.refusals.map(({ input }) => input)]);
  const behind = rest.status === 'refused' ? rest.refusals : [];
  return [...result.refusals, ...behind.filter(({ input }) => !said.has(input))];
}

const orZero = (value: number): number => (Number.isNaN(value) ? 0 : value);

function read(evidence: Evidence, temperatureC: number): ToughnessResult {
  const { kind } = evidence;
  if (kind === 'tests') return fromTests(evidence, temperatureC);
  const basis = basisOf(evidence, kind);
  if (!('test' in basis)) return toughnessAt(basis, temperatureC);
  // first at its own temperature, so that a refusal tells the two temperatures apart
  const tested = toughnessAt(basis, basis.test.temperatureC);
  return tested.status === 'refused'
    ? inTheForm(tested, kind === 'KIc')
    : toughnessAt(basis, temperatureC);
}

const OF_TEST: Readonly<Record<string, string>> = { temperatureC: 'testTemperatureC' };
const OF_SPECIMEN: Readonly<Record<string, string>> = {
  ...OF_TEST,
  thicknessMm: 'specimenMm',
  ligamentMm: 'specimenLigamentMm',
};

/** The same refusals under the names the form has for the numbers of a test. */
const inTheForm = ({ refusals }: Refused, specimen: boolean): Refused => ({
  status: 'refused',
  refusals: refusals.map((each) => ({
    ...each,
    input: (specimen ? OF_SPECIMEN : OF_TEST)[each.input] ?? each.input,
  })),
});

function fromTests(evidence: Evidence, temperatureC: number): ToughnessResult {
  const tests = testsOf(evidence);
  const reference = referenceTemperature(tests);
  if (reference.status === 'refused') return ofCapacity(reference);
  const valueC = { ...evidence.listOrigin, value: reference.t0C };
  const result = toughnessAt(masterBasis(evidence, { from: 'T0', valueC }), temperatureC);
  if (result.status === 'refused') return result;
  const { source, method, t0C, deviationC, used, leftOut } = reference;
  const step = (symbol: string, name: string, value: number): ToughnessStep => ({
    ...{ symbol, name, value, unit: '°C', formula: method, source },
    inputs: [`${used.length} tests used, ${leftOut.length} left out`],
  });
  return {
    ...result,
    source: `${result.source}; T0 from ${used.length} tests by ${source}`,
    steps: [
      step('T0', 'T0 from tests', t0C),
      step('s', 'Standard deviation of T0', deviationC),
      ...result.steps.filter(({ symbol }) => symbol !== 'T0'),
    ],
  };
}

const CAPACITY = /^tests\.\d+\.capacity\.(?!ligamentMm)/;

/** Strength and elasticity are entered once for all tests. */
const ofCapacity = ({ refusals }: Refused): Refused => ({
  status: 'refused',
  refusals: refusals.map((each) => ({
    ...each,
    input: each.input.replace(CAPACITY, '').replace('capacity.', ''),
  })),
});

/** Everything with an origin that the chosen kind rests on. */
function originsOf(evidence: Evidence): readonly Given<unknown>[] {
  const { numbers, list } = kindWords(evidence.kind);
  const givens = numbers
    .filter((name) => !wordsOf(name).chosen)
    .map((name) => numberOf(evidence, name))
    .filter(({ value }) => Number.isFinite(value));
  return list ? [...givens, { ...evidence.listOrigin, value: list }] : givens;
}
