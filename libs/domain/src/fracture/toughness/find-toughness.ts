import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import {
  toughnessFromCharpy,
  toughnessOnShelf,
  type CharpyInput,
  type ShelfInput,
} from './from-charpy';
import { toughnessFromReferenceCurve, type ReferenceCurveInput } from './from-reference-curve';
import { toughnessFromMasterCurve, type MasterCurveInput } from './from-reference-temperature';
import {
  toughnessFromCtod,
  toughnessFromJ,
  toughnessFromKIc,
  type CtodTest,
  type JTest,
  type PlaneStrainTest,
} from './from-specimen';
import type { FoundToughness, ToughnessResult } from './toughness-result';
import { rule } from './toughness-rules';
import { toughnessFromTable, type ToughnessTable } from './toughness-table';

/** What the toughness of a material is known from. Tests carry the temperature they were made at. */
export type ToughnessBasis =
  | { readonly method: 'KIc'; readonly test: PlaneStrainTest }
  | { readonly method: 'J'; readonly test: JTest }
  | { readonly method: 'CTOD'; readonly test: CtodTest }
  | { readonly method: 'Charpy'; readonly test: CharpyInput }
  | { readonly method: 'upper shelf'; readonly test: ShelfInput }
  | { readonly method: 'master curve'; readonly curve: Omit<MasterCurveInput, 'temperatureC'> }
  | {
      readonly method: 'reference curve';
      readonly curve: Omit<ReferenceCurveInput, 'temperatureC'>;
    }
  | { readonly method: 'table'; readonly table: ToughnessTable };

/**
 * Toughness at a temperature. A curve or a table is read there; a test holds at its own temperature and above,
 * since the toughness of ferritic steel rises with temperature, and is refused below.
 */
export function toughnessAt(basis: ToughnessBasis, temperatureC: number): ToughnessResult {
  const refusals = outOfBounds([rule('temperature', 'temperatureC', temperatureC)]);
  if (refusals.length > 0) return refused(...refusals);
  switch (basis.method) {
    case 'master curve':
      return toughnessFromMasterCurve({ ...basis.curve, temperatureC });
    case 'reference curve':
      return toughnessFromReferenceCurve({ ...basis.curve, temperatureC });
    case 'table':
      return toughnessFromTable(basis.table, temperatureC);
    default: {
      const tested = fromTest(basis);
      return tested.status === 'found' ? carriedTo(tested, temperatureC) : tested;
    }
  }
}

type TestedBasis = Extract<ToughnessBasis, { readonly test: unknown }>;

function fromTest(basis: TestedBasis): ToughnessResult {
  switch (basis.method) {
    case 'KIc':
      return toughnessFromKIc(basis.test);
    case 'J':
      return toughnessFromJ(basis.test);
    case 'CTOD':
      return toughnessFromCtod(basis.test);
    case 'Charpy':
      return toughnessFromCharpy(basis.test);
    case 'upper shelf':
      return toughnessOnShelf(basis.test);
  }
}

function carriedTo(tested: FoundToughness, temperatureC: number): FoundToughness | Refused {
  const { temperatureC: testedAt, cautions } = tested;
  if (temperatureC < testedAt) return tooCold(temperatureC, testedAt);
  if (temperatureC === testedAt) return tested;
  const caution = `Tested at ${testedAt} °C and taken for ${temperatureC} °C: cautious for ferritic steel in the transition, to be checked on the upper shelf.`;
  return { ...tested, temperatureC, cautions: [...cautions, caution] };
}

const tooCold = (temperatureC: number, testedAt: number): Refused =>
  refused({
    input: 'temperatureC',
    limit: `at least ${testedAt} °C, the temperature of the test`,
    value: temperatureC,
    message: `${temperatureC} °C is below the ${testedAt} °C of the test: the toughness may be lower there.`,
    instead: 'Test at the temperature, or use the master curve or a lower-bound curve.',
  });
