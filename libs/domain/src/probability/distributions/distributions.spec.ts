import fc from 'fast-check';
import type { Distribution } from './distribution';
import { distributionOf } from './distribution-of';
import { covOfLogSd, logSdBetweenCurves, logSdOfCov } from './lognormal-scatter';
import { VARIABLE_KINDS, type VariableSpec } from './variable-spec';

const SPECS: readonly VariableSpec[] = [
  { kind: 'normal', mean: 150, sd: 15 },
  { kind: 'lognormal', mean: 380, cov: 0.07 },
  { kind: 'weibull', minimum: 20, characteristic: 160, shape: 4 },
  { kind: 'exponential', mean: 2 },
  { kind: 'uniform', low: -1, high: 4 },
  { kind: 'gumbel', mean: 100, sd: 12 },
];
const named = SPECS.map((spec) => [spec.kind, made(spec)] as const);
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

function made(spec: VariableSpec): Distribution {
  const outcome = distributionOf('input', spec);
  if (outcome.status !== 'made') throw new Error(outcome.refusals[0]?.message);
  return outcome.distribution;
}

/** Midpoint sum over the probability: independent of the density and of the moments. */
function moment(distribution: Distribution, f: (x: number) => number): number {
  const n = 200_000;
  let sum = 0;
  for (let i = 0; i < n; i++) sum += f(distribution.quantile((i + 0.5) / n));
  return sum / n;
}

describe('the distributions', () => {
  it('cover every kind a person may choose', () => {
    expect(SPECS.map(({ kind }) => kind)).toEqual(VARIABLE_KINDS);
  });

  it.each(named)('%s: the quantile undoes the probability', (_, distribution) => {
    fc.assert(
      fc.property(between(1e-9, 1 - 1e-9), (p) => {
        const x = distribution.quantile(p);
        expect(distribution.below(x)).toBeCloseTo(p, 10);
        expect(distribution.below(x) + distribution.above(x)).toBeCloseTo(1, 12);
      }),
    );
  });

  it.each(named)('%s: standard normal values go there and back, in both tails', (_, d) => {
    fc.assert(
      fc.property(between(-7, 7), (u) => {
        expect(d.toNormal(d.fromNormal(u))).toBeCloseTo(u, 5);
      }),
    );
  });

  it.each(named)('%s: the probability rises with the slope of the density', (_, d) => {
    for (const p of [0.05, 0.3, 0.5, 0.8, 0.99]) {
      const x = d.quantile(p);
      const h = 1e-5 * d.sd;
      const slope = (d.below(x + h) - d.below(x - h)) / (2 * h);
      expect(slope / d.density(x)).toBeCloseTo(1, 6);
    }
  });

  it.each(named)('%s: mean and standard deviation are those of its values', (_, d) => {
    const mean = moment(d, (x) => x);
    const variance = moment(d, (x) => (x - d.mean) ** 2);
    expect((mean - d.mean) / d.sd).toBeCloseTo(0, 4);
    expect(Math.sqrt(variance) / d.sd).toBeCloseTo(1, 3);
  });

  it.each(named)('%s: nothing stands below or above the end of its range', (_, d) => {
    expect(d.below(-1e9)).toBe(0);
    expect(d.above(1e9)).toBe(0);
    expect(d.density(-1e9)).toBe(0);
  });
});

describe('what lognormal scatter means', () => {
  it('goes from the coefficient of variation to the logarithm and back', () => {
    fc.assert(
      fc.property(between(0.01, 3), (cov) => {
        expect(covOfLogSd(logSdOfCov(cov)) / cov).toBeCloseTo(1, 10);
      }),
    );
  });

  it('is read from a mean curve and the one two standard deviations above', () => {
    expect(logSdBetweenCurves(1, Math.exp(0.8))).toBeCloseTo(0.4, 12);
  });
});

describe('a random input that cannot be', () => {
  it.each<[string, VariableSpec]>([
    ['input.sd', { kind: 'normal', mean: 3, sd: 0 }],
    ['input.mean', { kind: 'normal', mean: Number.NaN, sd: 1 }],
    ['input.mean', { kind: 'lognormal', mean: -3, cov: 0.1 }],
    ['input.cov', { kind: 'lognormal', mean: 3, cov: 7 }],
    ['input.characteristic', { kind: 'weibull', minimum: 120, characteristic: 20, shape: 4 }],
    ['input.shape', { kind: 'weibull', minimum: 20, characteristic: 120, shape: 0 }],
    ['input.mean', { kind: 'exponential', mean: Infinity }],
    ['input.high', { kind: 'uniform', low: 4, high: 1 }],
    ['input.sd', { kind: 'gumbel', mean: 4, sd: -1 }],
  ])('is refused by name: %s', (input, spec) => {
    const outcome = distributionOf('input', spec);
    expect(outcome.status === 'refused' && outcome.refusals.map((r) => r.input)).toEqual([input]);
  });

  it('names the one bound that is no number, not the other', () => {
    const outcome = distributionOf('size', { kind: 'uniform', low: Number.NaN, high: 1 });
    expect(outcome.status === 'refused' && outcome.refusals).toHaveLength(1);
  });
});
