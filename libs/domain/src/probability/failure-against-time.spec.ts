import fc from 'fast-check';
import type { Distribution } from './distributions/distribution';
import { lognormal } from './distributions/lognormal';
import { normal } from './distributions/normal';
import { uniform } from './distributions/uniform';
import { conditionalFailureAgainstTime, failureAgainstTime } from './failure-against-time';
import { lifeEndedBy, lifeFractile } from './life-scatter';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const variable = (name: string, distribution: Distribution) => ({ name, distribution });
const at = (sample: Float64Array, i: number) => sample[i] ?? Number.NaN;

describe('failure against time', () => {
  const lives = {
    variables: [variable('life', lognormal(20, 0.4))],
    life: (x: Float64Array) => at(x, 0),
  };

  it('follows the distribution of the life, never falling', () => {
    const answer = failureAgainstTime(lives, [5, 10, 20, 40], { samples: 50_000, seed: 4 });
    if (answer.status === 'refused') throw new Error('refused');
    const curve = answer.curve.map(({ failure }) => failure.probability);
    expect(curve).toEqual([...curve].sort((a, b) => a - b));
    for (const { years, failure } of answer.curve) {
      const exact = lognormal(20, 0.4).below(years);
      expect(Math.abs(failure.probability - exact)).toBeLessThan(
        4 * failure.standardError + 4 / 50_000,
      );
    }
  });

  it('integrates the growth constant out: same curve, less error', () => {
    const median = uniform(10, 30);
    const conditional = conditionalFailureAgainstTime(
      {
        variables: [variable('life at the median constant', median)],
        probability: (x, years) => lifeEndedBy(years, at(x, 0), 0.4),
      },
      [8, 15],
      { samples: 2048, seed: 3 },
    );
    const crude = failureAgainstTime(
      {
        variables: [variable('median', median), variable('ln C', normal(0, 0.4))],
        life: (x) => at(x, 0) * Math.exp(-at(x, 1)),
      },
      [8, 15],
      { samples: 50_000, seed: 3 },
    );
    if (conditional.status === 'refused' || crude.status === 'refused') throw new Error('refused');
    conditional.curve.forEach(({ failure }, i) => {
      const other = crude.curve[i]?.failure;
      expect(failure.standardError).toBeLessThan((other?.standardError ?? 0) / 10);
      expect(Math.abs(failure.probability - (other?.probability ?? 9))).toBeLessThan(
        4 * (other?.standardError ?? 0),
      );
    });
  });

  it('knows a life that never ends', () => {
    const endless = { ...lives, life: () => Infinity };
    const answer = failureAgainstTime(endless, [100], { samples: 100, seed: 1 });
    expect(answer.status === 'estimated' && answer.curve[0]?.failure.probability).toBe(0);
    expect(lifeEndedBy(10, Infinity, 0.4)).toBe(0);
  });

  it('refuses times that are none and lives that are no number', () => {
    expect(failureAgainstTime(lives, [], { samples: 100, seed: 1 }).status).toBe('refused');
    expect(failureAgainstTime(lives, [-1], { samples: 100, seed: 1 }).status).toBe('refused');
    const broken = { ...lives, life: () => Number.NaN };
    expect(failureAgainstTime(broken, [1], { samples: 100, seed: 1 }).status).toBe('refused');
  });

  it('has fractiles that are its inverse', () => {
    fc.assert(
      fc.property(between(0.001, 0.999), between(1, 50), between(0.1, 1), (p, median, sd) => {
        expect(lifeEndedBy(lifeFractile(p, median, sd), median, sd)).toBeCloseTo(p, 9);
      }),
    );
  });
});
