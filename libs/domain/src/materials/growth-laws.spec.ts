import { growthPerCycle } from '../growth/growth-law';
import { GROWTH_LAWS, growthLaw } from './growth-laws';
import { airThreshold, temperatureFactor } from './growth-threshold';

describe('the library of growth laws', () => {
  it('has a key of its own and a source for every law', () => {
    expect(new Set(GROWTH_LAWS.map(({ key }) => key)).size).toBe(GROWTH_LAWS.length);
    for (const { source, title } of GROWTH_LAWS) {
      expect(source).toMatch(/BS 7910/);
      expect(source).toMatch(/from memory/);
      expect(title).toMatch(/^Steel/);
    }
  });

  it('claims a threshold in air only', () => {
    for (const { environment, thresholdMPaSqrtMm } of GROWTH_LAWS) {
      expect(thresholdMPaSqrtMm).toBe(environment === 'air' ? 63 : 0);
    }
  });

  it.each(['air', 'marine-free', 'marine-cp850', 'marine-cp1100'])(
    'grows faster on the upper curve than on the mean: %s',
    (environment) => {
      for (const ratio of ['low', 'high']) {
        const [mean, upper] = ['mean', 'upper'].map((curve) =>
          growthLaw(`steel-${environment}-${ratio}-${curve}`),
        );
        if (!mean || !upper) throw new Error('law missing');
        for (const range of [70, 150, 400, 1500]) {
          expect(growthPerCycle(upper)(range)).toBeGreaterThan(growthPerCycle(mean)(range));
        }
      }
    },
  );

  it('grows at least as fast at a high stress ratio as at a low one', () => {
    const [low, high] = ['low', 'high'].map((ratio) => growthLaw(`steel-air-${ratio}-upper`));
    if (!low || !high) throw new Error('law missing');
    for (const range of [70, 150, 400, 1500]) {
      expect(growthPerCycle(high)(range)).toBeGreaterThanOrEqual(growthPerCycle(low)(range));
    }
  });

  it('knows no law by a wrong key', () => {
    expect(growthLaw('no-such-law')).toBeUndefined();
  });
});

describe('the threshold in air', () => {
  it('falls with the stress ratio without a jump', () => {
    expect(airThreshold(0.5)).toBe(63);
    expect(airThreshold(0.5 - 1e-9)).toBeCloseTo(63, 6);
    expect(airThreshold(-1)).toBe(170);
  });
});

describe('growth at temperature', () => {
  it('rises with the cube of the modulus ratio', () => {
    expect(temperatureFactor(207_000, 207_000)).toBe(1);
    expect(temperatureFactor(200_000, 100_000)).toBe(8);
  });
});
