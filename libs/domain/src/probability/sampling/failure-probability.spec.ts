import type { Distribution } from '../distributions/distribution';
import { normal } from '../distributions/normal';
import { weibull } from '../distributions/weibull';
import { confirmedReliability } from '../confirmed-reliability';
import { failureProbabilityOf } from '../reliability-index';
import { firstOrderReliability } from '../form/first-order-reliability';
import { failureProbability } from './failure-probability';

const variable = (name: string, distribution: Distribution) => ({ name, distribution });
const at = (sample: Float64Array, i: number) => sample[i] ?? Number.NaN;

const RESISTANCE = variable('resistance', normal(100, 15));
const LOAD = variable('load', normal(50, 10));
const LINEAR = {
  variables: [RESISTANCE, LOAD],
  margin: (x: Float64Array) => at(x, 0) - at(x, 1),
};

function form(state: Parameters<typeof firstOrderReliability>[0]) {
  const answer = firstOrderReliability(state);
  if (answer.status !== 'converged') throw new Error(answer.status);
  return answer;
}

describe('sampling', () => {
  const exact = failureProbabilityOf(50 / Math.hypot(15, 10));

  function sampled(options: Parameters<typeof failureProbability>[1]) {
    const answer = failureProbability(LINEAR, options);
    if (answer.status !== 'estimated') throw new Error(answer.refusals[0]?.message);
    return answer;
  }

  it.each(['random', 'sobol'] as const)('by %s points holds the exact value', (points) => {
    const answer = sampled({ samples: 100_000, seed: 5, points });
    expect(Math.abs(answer.probability - exact)).toBeLessThan(4 * answer.standardError);
    expect(answer.low95).toBeLessThan(answer.high95);
    expect(answer.samples).toBe(100_000);
  });

  it.each(['random', 'sobol'] as const)('around the design point needs few (%s)', (points) => {
    const centre = form(LINEAR).designPoint;
    const answer = sampled({ samples: 4096, seed: 2, points, centre });
    expect(Math.abs(answer.probability - exact)).toBeLessThan(4 * answer.standardError);
    expect(answer.coefficientOfVariation).toBeLessThan(0.05);
    expect(answer.method).toMatch(/around the design point/);
  });

  it('gives the same bits for the same seed, others for another', () => {
    const once = sampled({ samples: 2000, seed: 9 });
    expect(sampled({ samples: 2000, seed: 9 })).toEqual(once);
    expect(sampled({ samples: 2000, seed: 10 })).not.toEqual(once);
  });

  it('is never sure of a failure it did not see', () => {
    const far = { ...LINEAR, variables: [RESISTANCE, variable('load', normal(-200, 10))] };
    const answer = failureProbability(far, { samples: 1000, seed: 1 });
    expect(answer).toMatchObject({ probability: 0, coefficientOfVariation: null });
    expect(answer.status === 'estimated' && answer.high95).toBeCloseTo(3.84 / 1003.84, 4);
    expect(answer.status === 'estimated' && answer.caution).toMatch(/No failure was seen/);
  });

  it('has an upper bound also where spread points see nothing, and none around a wrong centre', () => {
    const far = { ...LINEAR, variables: [RESISTANCE, variable('load', normal(-200, 10))] };
    const spread = failureProbability(far, { samples: 1024, seed: 1, points: 'sobol' });
    expect(spread.status === 'estimated' && spread.high95).toBeCloseTo(3.84 / 1027.84, 4);
    const wrong = failureProbability(far, { samples: 1024, seed: 1, centre: [0, 0] });
    expect(wrong.status === 'estimated' && wrong.high95).toBe(1);
  });

  it('names a sample too small to trust', () => {
    const answer = sampled({ samples: 500, seed: 3 });
    expect(answer.caution).toMatch(/take more samples|No failure/);
  });

  it.each([
    ['samples', { samples: 3, seed: 1 }],
    ['samples', { samples: 1e12, seed: 1 }],
    ['samples', { samples: 1000.5, seed: 1 }],
    ['seed', { samples: 1000, seed: -1 }],
    ['seed', { samples: 1000, seed: Number.NaN }],
    ['centre', { samples: 1000, seed: 1, centre: [1] }],
    ['centre.0', { samples: 1000, seed: 1, centre: [Infinity, 0] }],
  ])('refuses by name: %s', (input, options) => {
    const answer = failureProbability(LINEAR, options);
    expect(answer.status === 'refused' && answer.refusals[0]?.input).toBe(input);
  });

  it('refuses a margin that is no number instead of calling it safe', () => {
    const broken = { ...LINEAR, margin: () => Number.NaN };
    expect(failureProbability(broken, { samples: 100, seed: 1 }).status).toBe('refused');
  });

  it('refuses more Sobol dimensions than the table has', () => {
    const variables = Array.from({ length: 17 }, (_, i) => variable(`x${i}`, normal(0, 1)));
    const many = { variables, margin: () => 1 };
    expect(failureProbability(many, { samples: 100, seed: 1, points: 'sobol' }).status).toBe(
      'refused',
    );
    expect(failureProbability(many, { samples: 100, seed: 1 }).status).toBe('estimated');
  });
});

describe('sampling around the design point of the first-order answer', () => {
  const toughness = weibull({ minimum: 20, characteristic: 160, shape: 4 });
  const load = [variable('K', normal(30, 3))];
  const whole = {
    variables: [...load, variable('Kmat', toughness)],
    margin: (x: Float64Array) => at(x, 1) - at(x, 0),
  };
  const conditional = {
    variables: load,
    probability: (x: Float64Array) => toughness.below(at(x, 0)),
  };

  it('needs 256 evaluations for a few per cent on a rare failure, whichever way', () => {
    const ask = (given: typeof conditional | null, samples: number) => {
      const answer = confirmedReliability({ whole, conditional: given, samples, seed: 1 });
      if (answer.status === 'refused') throw new Error('refused');
      return answer;
    };
    const [given, plain] = [ask(conditional, 256), ask(null, 8192)];
    expect(given.sampled.coefficientOfVariation).toBeLessThan(0.05);
    expect(given.sampled.probability).toBeLessThan(1e-4);
    expect(Math.abs(plain.sampled.probability - given.sampled.probability)).toBeLessThan(
      4 * (plain.sampled.standardError + given.sampled.standardError),
    );
    expect(given.firstOrderOverSampled).toBeGreaterThan(0.5);
    expect(given.firstOrderOverSampled).toBeLessThan(2);
  });

  it('samples around the mean when there is no design point', () => {
    const safe = { ...whole, margin: () => 1 };
    const answer = confirmedReliability({ whole: safe, conditional: null, samples: 256, seed: 1 });
    expect(answer).toMatchObject({
      status: 'confirmed',
      firstOrder: { status: 'no failure found' },
      sampled: { probability: 0, method: 'scrambled Sobol points' },
      firstOrderOverSampled: null,
    });
  });

  it('is refused for what cannot be sampled', () => {
    const none = { variables: [], margin: () => 1 };
    const ask = (state: typeof whole | typeof none, samples: number) =>
      confirmedReliability({ whole: state, conditional: null, samples, seed: 1 }).status;
    expect(ask(none, 256)).toBe('refused');
    expect(ask(whole, 1)).toBe('refused');
  });
});
