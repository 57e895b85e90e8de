import { assessFlaw } from './assess-flaw';
import type { AssessmentInput, GrowthInput } from './assessment-input';
import type { AssessedFlaw } from './assessment-outcome';
import { given, sampleInput, type Variation } from './testing/sample-input';

function withGrowth(variation: Variation, growth: Partial<GrowthInput>): AssessmentInput {
  const input = sampleInput({ horizon: 100, ...variation });
  return { ...input, growth: { ...input.growth, ...growth } };
}

function assessed(input: AssessmentInput): AssessedFlaw {
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

const lastOf = ({ path }: AssessedFlaw) => path[path.length - 1];
const own = (coefficient: number, exponent: number, threshold = 0) => ({
  law: {
    kind: 'own' as const,
    coefficient: given(coefficient),
    exponent: given(exponent),
    thresholdMPaSqrtM: given(threshold),
    plateauMmPerYear: null,
  },
  temperatureC: given(20),
});

describe('growth with time by K', () => {
  it('with an exponent of nothing is a constant rate', () => {
    const law = assessed(withGrowth({ cycles: 0 }, { withTime: own(0.4, 0) }));
    const rate = assessed(sampleInput({ cycles: 0, stressCorrosion: 0.4, horizon: 100 }));
    expect(law.life.end).toBe(rate.life.end);
    expect(lastOf(law)?.years).toBeCloseTo(lastOf(rate)?.years ?? 0, 6);
  });

  it('stands still below its threshold', () => {
    const still = assessed(withGrowth({ cycles: 0, membrane: 60 }, { withTime: own(1, 1, 50) }));
    expect(still.life.end).toBe('no growth');
  });

  it('adds to fatigue', () => {
    const fatigue = assessed(withGrowth({ toughness: 50 }, {}));
    const both = assessed(withGrowth({ toughness: 50 }, { withTime: own(0.01, 1) }));
    expect(both.life.years).toBeLessThan(fatigue.life.years ?? 0);
    expect(both.sheet.some(({ name }) => name.startsWith('Growth with time by K'))).toBe(true);
  });

  it('by a published law is refused at a temperature it is not for', () => {
    const law = { kind: 'published' as const, key: 'alloy-600-primary-water' };
    const outcome = assessFlaw(
      withGrowth({ cycles: 0 }, { withTime: { law, temperatureC: given(60) } }),
    );
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'growth.withTime.temperatureC' }],
    });
  });

  it('by a law nobody knows is refused by name', () => {
    const law = { kind: 'published' as const, key: 'no-such-law' };
    const outcome = assessFlaw(
      withGrowth({ cycles: 0 }, { withTime: { law, temperatureC: given(60) } }),
    );
    expect(outcome).toMatchObject({ refusals: [{ input: 'growth.withTime.law.key' }] });
  });
});

describe('a wall that corrodes', () => {
  const corroding = (rate: number, face: 'cracked' | 'opposite', stressCorrosion = 0.4) =>
    assessed(
      withGrowth(
        { cycles: 0, stressCorrosion, allowance: 0 },
        { thinning: { rateMmPerYear: given(rate), face } },
      ),
    );

  it('on the far face reaches 0.8 of the wall at (q B0 − a0)/(v + q r)', () => {
    const flaw = corroding(0.1, 'opposite');
    expect(flaw.life.end).toBe('through-wall');
    expect(lastOf(flaw)?.years).toBeCloseTo((0.8 * 25 - 4) / (0.4 + 0.8 * 0.1), 5);
  });

  it('on the cracked face takes from the depth what its mouth loses', () => {
    const flaw = corroding(0.1, 'cracked');
    expect(lastOf(flaw)?.years).toBeCloseTo((0.8 * 25 - 4) / (0.4 - 0.1 + 0.8 * 0.1), 5);
  });

  it('starts the growth of a flaw that stands still now, once stress has risen', () => {
    const variation = { membrane: 90, threshold: 380, cycles: 100_000, allowance: 0 };
    const thinning = { rateMmPerYear: given(0.4), face: 'opposite' as const };
    expect(assessed(withGrowth(variation, {})).life.end).toBe('no growth');
    const thin = assessed(withGrowth(variation, { thinning }));
    expect(thin.life.end).not.toBe('no growth');
    expect(lastOf(thin)?.heightMm).toBeGreaterThan(4);
  });

  it('raises stress as it thins, so that the flaw ends sooner', () => {
    const loaded = (rate: number) =>
      assessed(
        withGrowth(
          { cycles: 0, stressCorrosion: 0.1, membrane: 200, toughness: 50 },
          { thinning: { rateMmPerYear: given(rate), face: 'opposite' } },
        ),
      );
    const [thin, sound] = [loaded(0.3), loaded(0)];
    expect(thin.life.end).toBe('limit reached');
    expect(thin.life.years).toBeLessThan(sound.life.years ?? 0);
    expect(sound.life.years).toBe(
      assessed(
        sampleInput({
          cycles: 0,
          stressCorrosion: 0.1,
          membrane: 200,
          toughness: 50,
          horizon: 100,
        }),
      ).life.years,
    );
  });
});

describe('a published law of another form', () => {
  const fatigue = (key: string, stressRatio: number | null) => {
    const { growth } = sampleInput({ horizon: 100, cycles: 2000 });
    if (!growth.fatigue) throw new Error('no fatigue');
    const [block] = growth.fatigue.blocks;
    if (!block) throw new Error('no block');
    return withGrowth(
      { toughness: 50 },
      {
        fatigue: {
          law: {
            published: true,
            key,
            title: key,
            source: 'test',
            stages: [],
            thresholdMPaSqrtMm: 0,
          },
          blocks: [{ ...block, cyclesPerYear: 2000, stressRatio }],
        },
      },
    );
  };
  const KEY = 'ferritic-air-code';

  it('grows faster the higher the stress ratio', () => {
    const [low, high] = [assessed(fatigue(KEY, 0.1)), assessed(fatigue(KEY, 0.7))];
    expect(high.life.years).toBeLessThan(low.life.years ?? 0);
  });

  it('needs the stress ratio of every block', () => {
    expect(assessFlaw(fatigue(KEY, null))).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'growth.fatigue.blocks.0.stressRatio' }],
    });
  });

  it('that is not in the library is refused by name', () => {
    expect(assessFlaw(fatigue('no-such-law', 0.1))).toMatchObject({
      refusals: [{ input: 'growth.fatigue.law.key', value: 'no-such-law' }],
    });
  });
});
