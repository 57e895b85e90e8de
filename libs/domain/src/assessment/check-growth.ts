import { outOfBounds, type Refusal } from '../geometry/refusal';
import { matchBlocks } from '../growth/match-blocks';
import type { CrackLaw } from '../materials/crack-law';
import { crackLaw } from '../materials/crack-law-library';
import type { AssessmentInput, FatigueLawInput } from './assessment-input';
import { driversOf, timeLawOf } from './drivers';

const ROOM_TEMPERATURE = 20;

/** Whether the growth laws can be used for the cycles and temperatures given. */
export const checkGrowth = (input: AssessmentInput): readonly Refusal[] => [
  ...fatigueRefusals(input),
  ...withTimeRefusals(input),
];

/** What must be said with a published law though it may be used. */
export function growthCautions(input: AssessmentInput): readonly string[] {
  const law = publishedLaw(input);
  const blocks = driversOf(input).fatigue?.blocks ?? [];
  if (!law) return [];
  const matched = matchBlocks(law, blocks);
  return matched.status === 'matched' ? matched.cautions : [];
}

const publishedLaw = ({ growth: { fatigue } }: AssessmentInput): CrackLaw | undefined =>
  fatigue?.law.published ? crackLaw(fatigue.law.key) : undefined;

function fatigueRefusals(input: AssessmentInput): readonly Refusal[] {
  const { fatigue } = input.growth;
  if (!fatigue) return [];
  if (!fatigue.law.published) return stageRefusals(fatigue.law);
  const law = publishedLaw(input);
  if (!law) return [unknownLaw('growth.fatigue.law.key', fatigue.law.key)];
  const matched = matchBlocks(law, driversOf(input).fatigue?.blocks ?? []);
  const [min, max] = law.scope.temperatureC;
  const temperature = outOfBounds([
    {
      input: 'growth.fatigue.temperatureC',
      name: 'Temperature of the cycles',
      unit: '°C',
      value: fatigue.temperatureC?.value ?? ROOM_TEMPERATURE,
      min,
      max,
      instead: `Choose a law for this temperature: ${law.title} is not for it.`,
    },
  ]);
  return [...(matched.status === 'refused' ? matched.refusals : []), ...temperature];
}

function withTimeRefusals({ growth: { withTime } }: AssessmentInput): readonly Refusal[] {
  if (!withTime) return [];
  const law = timeLawOf(withTime.law);
  if (!law) {
    const { law: given } = withTime;
    return [unknownLaw('growth.withTime.law.key', given.kind === 'published' ? given.key : '')];
  }
  const [min, max] = law.temperatureC;
  return outOfBounds([
    {
      input: 'growth.withTime.temperatureC',
      name: 'Metal temperature',
      unit: '°C',
      value: withTime.temperatureC.value,
      min,
      max: Math.min(max, 2000),
      instead: `Take the plant's own rate: ${law.title} is not for this temperature.`,
    },
  ]);
}

const unknownLaw = (input: string, key: string): Refusal => ({
  input,
  limit: 'a law of the library',
  value: key,
  message: `The library has no law called ${key}.`,
  instead: 'Choose a law of the list.',
});

function stageRefusals({ stages }: FatigueLawInput): readonly Refusal[] {
  if (stages.length === 0) {
    return [
      {
        input: 'growth.fatigue.law.stages',
        limit: 'at least one stage',
        value: 0,
        message: 'The growth law has no stage.',
        instead: 'Choose a law of the site’s library.',
      },
    ];
  }
  const at = stages.findIndex((stage, i) => i > 0 && stage.exponent === stages[i - 1]?.exponent);
  if (at < 0) return [];
  return [
    {
      input: `growth.fatigue.law.stages.${at}.exponent`,
      limit: 'stages of different exponent',
      value: stages[at]?.exponent ?? null,
      message: 'Two stages of the growth law have the same exponent: they never meet.',
      instead: 'Give them as one stage.',
    },
  ];
}
