import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import type { MPaSqrtMm } from '../../units/quantity';
import type { FoundToughness, ToughnessResult } from './toughness-result';
import { rule } from './toughness-rules';

/** One load case: when, how cold and how highly stressed. */
export interface LoadCase {
  readonly name: string;
  readonly temperatureC: number;
  /** Stress of the case over that of the assessment. */
  readonly stressFactor: number;
}

/** A load case with the toughness at its temperature. */
export interface CaseToughness {
  readonly loadCase: LoadCase;
  readonly toughness: FoundToughness;
  /** Toughness over stress factor: K follows the stress, so the least governs fracture [MPa·√mm]. */
  readonly kMatPerStressMPaSqrtMm: MPaSqrtMm;
}

/** Every load case, and the one that governs fracture. */
export interface GoverningTemperature {
  readonly status: 'found';
  readonly cases: readonly CaseToughness[];
  readonly governing: CaseToughness;
}

/**
 * Which load case governs fracture: the one of least toughness for its stress, the first of equals. A case
 * whose toughness is refused refuses the whole, for it might be the one.
 */
export function governingTemperature(
  loadCases: readonly LoadCase[],
  toughnessAt: (temperatureC: number) => ToughnessResult,
): GoverningTemperature | Refused {
  const rated = loadCases.map((loadCase, i) => rate(loadCase, i, toughnessAt));
  const refusals = rated.flatMap((each) => ('refusals' in each ? each.refusals : []));
  const cases = rated.flatMap((each) => ('refusals' in each ? [] : [each]));
  const [first, ...others] = cases;
  if (refusals.length > 0 || !first) {
    return refused(...(refusals.length > 0 ? refusals : [NO_CASE]));
  }
  const governing = others.reduce(
    (least, each) => (each.kMatPerStressMPaSqrtMm < least.kMatPerStressMPaSqrtMm ? each : least),
    first,
  );
  return { status: 'found', cases, governing };
}

function rate(
  loadCase: LoadCase,
  index: number,
  toughnessAt: (temperatureC: number) => ToughnessResult,
): CaseToughness | Refused {
  const { name, temperatureC, stressFactor } = loadCase;
  const broken = outOfBounds([
    rule('temperature', `loadCases.${index}.temperatureC`, temperatureC),
    {
      input: `loadCases.${index}.stressFactor`,
      name: `Stress factor of ${name}`,
      unit: '',
      value: stressFactor,
      min: 0,
      max: 10,
      above: true,
      instead: 'Give the stress of the case over that of the assessment; leave out a case without.',
    },
  ]);
  if (broken.length > 0) return refused(...broken);
  const toughness = toughnessAt(temperatureC);
  if (toughness.status === 'refused') return named(name, index, toughness);
  const kMatPerStressMPaSqrtMm = (toughness.kMatMPaSqrtMm / stressFactor) as MPaSqrtMm;
  return { loadCase, toughness, kMatPerStressMPaSqrtMm };
}

const named = (name: string, index: number, { refusals }: Refused): Refused =>
  refused(
    ...refusals.map((refusal) => ({
      ...refusal,
      input: `loadCases.${index}.${refusal.input}`,
      message: `${name}: ${refusal.message}`,
    })),
  );

const NO_CASE: Refusal = {
  input: 'loadCases',
  limit: 'at least one load case',
  value: 0,
  message: 'There is no load case to judge.',
  instead: 'Enter the temperature and the stress of every load case.',
};
