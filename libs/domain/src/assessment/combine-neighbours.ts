import { combineFlaws, type CombinationStep } from '../geometry/characterisation/combine-flaws';
import {
  interactionRule,
  type InteractionRule,
  type PlacedFlaw,
} from '../geometry/characterisation/interaction-rules';
import type { AssessmentInput } from './assessment-input';
import { factorsOf } from './partial-factors';

/** What the rules of interaction made of the flaw and those beside it. */
export interface Neighbourhood {
  /** The flaw, or the one that encloses it and what it interacts with. */
  readonly flaw: PlacedFlaw;
  /** Those it does not interact with yet. */
  readonly others: readonly PlacedFlaw[];
  readonly steps: readonly CombinationStep[];
  readonly rule: InteractionRule;
}

const OWN = 'this flaw';

/** Neighbours grow by the same allowance and factor as the flaw itself, about their own centres. */
export function combineNeighbours(
  input: AssessmentInput,
  own: Pick<PlacedFlaw, 'kind' | 'a' | 'c' | 'ligamentMm'>,
): Neighbourhood {
  const rule = interactionRule(input.interactionRule ?? null);
  const flaw: PlacedFlaw = { ...own, name: OWN, positionMm: 0, planeMm: 0 };
  const found = combineFlaws([flaw, ...neighboursOf(input)], rule);
  // the sizes have passed their checks: nothing is refused here
  if (found.status === 'refused') return { flaw, others: [], steps: [], rule };
  const whole = found.flaws.find(({ name }) => name.split(' + ').includes(OWN)) ?? flaw;
  return {
    flaw: whole,
    others: found.flaws.filter((each) => each !== whole),
    steps: found.steps,
    rule,
  };
}

function neighboursOf(input: AssessmentInput): PlacedFlaw[] {
  const { sizing, neighbours } = input;
  const { size } = factorsOf(input);
  return (neighbours ?? []).map(
    ({ name, kind, heightMm, lengthMm, ligamentMm, distanceMm, planeOffsetMm }) => {
      const height = size * (heightMm.value + sizing.heightAllowanceMm.value);
      const grown = (height - heightMm.value) / 2;
      return {
        name,
        kind,
        a: kind === 'surface' ? height : height / 2,
        c: (size * (lengthMm.value + sizing.lengthAllowanceMm.value)) / 2,
        ligamentMm: kind === 'surface' ? 0 : Math.max((ligamentMm?.value ?? 0) - grown, 0),
        positionMm: distanceMm.value,
        planeMm: planeOffsetMm.value,
      };
    },
  );
}
