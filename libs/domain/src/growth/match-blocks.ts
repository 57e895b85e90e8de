import { outOfBounds, refused, type Refusal, type Refused } from '../geometry/refusal';
import type { CrackLaw } from '../materials/crack-law';
import { LOWEST_RATIO } from '../materials/crack-law-scopes';
import type { StressBlock } from './growth-rates';
import type { LawConditions } from './laws/rate-per-cycle';
import { temperatureRefusals } from './laws/temperature-refusals';

/** Whether a law may be used for a histogram, and what must be said with it. */
export interface MatchedBlocks {
  readonly status: 'matched';
  readonly cautions: readonly string[];
}

/** Forms that hold the stress ratio inside; the others are published for a class of it. */
const dependsOnRatio = ({ form, threshold }: CrackLaw): boolean =>
  form !== 'stages' || threshold.slope !== 0;

/**
 * Holds the stress ratio of every block against the law's own. A law for a lower ratio than the cycle's is
 * refused, as it would grow too little; one for a higher ratio is taken with a word. The temperature, where given or
 * needed, must be one the law is for.
 */
export function matchBlocks(
  law: CrackLaw,
  blocks: readonly StressBlock[],
  { temperatureC }: LawConditions = {},
): MatchedBlocks | Refused {
  const refusals = [
    ...blocks.flatMap((block, i) => refusalsOf(law, block, i)),
    ...temperatureRefusals(law, temperatureC),
  ];
  if (refusals.length > 0) return refused(...refusals);
  return { status: 'matched', cautions: cautionsOf(law, blocks) };
}

function refusalsOf(law: CrackLaw, { stressRatio }: StressBlock, i: number): readonly Refusal[] {
  const [min, max] = law.scope.stressRatio;
  const input = `growth.fatigue.blocks.${i}.stressRatio`;
  if (stressRatio === undefined) return dependsOnRatio(law) ? [missing(input, law)] : [];
  return outOfBounds([
    {
      input,
      name: `Stress ratio of block ${i + 1}`,
      unit: '',
      value: stressRatio,
      min: law.scope.safeBelowRatio ? LOWEST_RATIO : min,
      max,
      instead: `Choose a law for this stress ratio: ${law.title} is not for it.`,
    },
  ]);
}

const missing = (input: string, { title }: CrackLaw): Refusal => ({
  input,
  limit: 'must be given',
  value: null,
  message: `${title} depends on the stress ratio, and the block gives none.`,
  instead: 'Give the stress ratio of every block, residual stress included.',
});

function cautionsOf(law: CrackLaw, blocks: readonly StressBlock[]): readonly string[] {
  const [min, max] = law.scope.stressRatio;
  const ratios = blocks.map(({ stressRatio }) => stressRatio);
  return [
    ratios.some((ratio) => ratio !== undefined && ratio < min)
      ? `${law.title} is for a stress ratio of at least ${min}: the growth is on the safe side.`
      : null,
    ratios.includes(undefined) && max <= 0.5
      ? `${law.title} is for a low stress ratio, and a block gives none: at a weld the ratio is high.`
      : null,
  ].filter((text) => text !== null);
}
