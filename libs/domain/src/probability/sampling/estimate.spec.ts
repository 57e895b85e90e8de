import fc from 'fast-check';
import { uniform } from '../distributions/uniform';
import { estimateOf } from './estimate';
import { conditionalFailureProbability, failureProbability } from './failure-probability';
import { sampleMeans, SCRAMBLINGS } from './sample-mean';

const U = { name: 'u', distribution: uniform(0, 1) };
const first = (x: Float64Array) => x[0] ?? Number.NaN;
const share = (p: number) => ({ variables: [U], margin: (x: Float64Array) => first(x) - p });
const frame = { samples: 1000, method: 'random points', seed: 1, quantile: 1.96 } as const;

describe('what an estimate says of its error', () => {
  it('holds the true share in about 95 of 100 repetitions', () => {
    for (const p of [0.02, 0.3]) {
      let held = 0;
      const n = 400;
      for (let seed = 0; seed < n; seed++) {
        const answer = failureProbability(share(p), { samples: 400, seed });
        if (answer.status === 'refused') throw new Error('refused');
        if (answer.low95 <= p && p <= answer.high95) held += 1;
      }
      expect(Math.abs(held / n - 0.95)).toBeLessThan(0.045);
    }
  });

  it('scatters as much as it says, from repetition to repetition', () => {
    const answers = Array.from({ length: 300 }, (_, seed) =>
      failureProbability(share(0.1), { samples: 500, seed }),
    ).flatMap((answer) => (answer.status === 'estimated' ? [answer] : []));
    const mean = answers.reduce((sum, { probability }) => sum + probability, 0) / answers.length;
    const variance =
      answers.reduce((sum, { probability }) => sum + (probability - mean) ** 2, 0) / answers.length;
    const stated = answers.reduce((sum, { standardError }) => sum + standardError, 0) / 300;
    expect(Math.sqrt(variance) / stated).toBeGreaterThan(0.85);
    expect(Math.sqrt(variance) / stated).toBeLessThan(1.15);
  });

  it('stays between 0 and 1 with its bounds about it', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1.2, noNaN: true }),
        fc.double({ min: 0, max: 0.5, noNaN: true }),
        fc.boolean(),
        (mean, standardError, counted) => {
          const { probability, low95, high95 } = estimateOf(
            { mean, standardError },
            { ...frame, counted },
          );
          expect(low95).toBeGreaterThanOrEqual(0);
          expect(high95).toBeLessThanOrEqual(1);
          expect(low95).toBeLessThanOrEqual(probability + 1e-12);
          expect(high95).toBeGreaterThanOrEqual(probability - 1e-12);
        },
      ),
    );
  });

  it('names an error above a third of the estimate', () => {
    const of = (standardError: number) =>
      estimateOf({ mean: 0.01, standardError }, { ...frame, counted: false }).caution;
    expect(of(0.003)).toBeNull();
    expect(of(0.004)).toMatch(/take more samples/);
  });
});

describe('the means of several outputs', () => {
  it('come from the same samples: a sum of outputs is the sum of their means', () => {
    const { tallies } = sampleMeans(
      {
        variables: [U, U],
        outputs: 3,
        evaluate: (x, into) => {
          into[0] = x[0] as number;
          into[1] = (x[1] as number) ** 2;
          into[2] = (into[0] + into[1]) / 2;
        },
      },
      { samples: 1000, seed: 3, points: 'random', centre: null },
    );
    const [a, b, both] = tallies.map(({ mean }) => mean);
    expect(both).toBeCloseTo(((a ?? 0) + (b ?? 0)) / 2, 12);
  });

  it('are taken over whole scramblings: the number of samples is rounded up to them', () => {
    const answer = conditionalFailureProbability(
      { variables: [U], probability: first },
      { samples: 100, seed: 1 },
    );
    expect(answer.status === 'estimated' && answer.samples).toBe(7 * SCRAMBLINGS);
    expect(answer.status === 'estimated' && answer.probability).toBeCloseTo(0.5, 1);
  });

  it('converge with spread points much faster than the root of their number', () => {
    const error = (samples: number) => {
      const answer = conditionalFailureProbability(
        { variables: [U], probability: (x) => first(x) ** 2 },
        { samples, seed: 5 },
      );
      return answer.status === 'estimated' ? answer.standardError : Number.NaN;
    };
    expect(error(16 * 64) / error(16 * 1024)).toBeGreaterThan(16);
  });
});
