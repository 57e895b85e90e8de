import fc from 'fast-check';
import { failureGivenPlace } from './conditional-on-toughness';
import type { RandomVariable } from './distributions/distribution';
import { lognormal } from './distributions/lognormal';
import { normal } from './distributions/normal';
import { uniform } from './distributions/uniform';
import { weibull } from './distributions/weibull';
import { conditionalFailureAgainstTime, failureAgainstTime } from './failure-against-time';
import { firstOrderReliability } from './form/first-order-reliability';
import { integrateConditional } from './integrate-conditional';
import { lifeEndedBy, lifeFractile } from './life-scatter';
import {
  failureProbabilityOf,
  lognormalIndex,
  normalIndex,
  reliabilityIndex,
} from './reliability-index';
import { conditionalFailureProbability, failureProbability } from './sampling/failure-probability';
import { FAILURE_CONSEQUENCES, SAFETY_COSTS, TARGET_RELIABILITY } from './target-reliability';
import { TYPICAL_SCATTER } from './typical-scatter';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const variable = (name: string, distribution: RandomVariable['distribution']) => ({
  name,
  distribution,
});
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

describe('the reliability index', () => {
  it('is the other side of the failure probability', () => {
    fc.assert(
      fc.property(between(-6, 30), (beta) => {
        expect(reliabilityIndex(failureProbabilityOf(beta))).toBeCloseTo(beta, 6);
      }),
    );
  });

  it('is met or not by targets that rise with consequence and with cheap safety', () => {
    for (const cost of SAFETY_COSTS) {
      const row = FAILURE_CONSEQUENCES.map((each) => TARGET_RELIABILITY[cost][each]);
      expect(row).toEqual([...row].sort());
    }
    for (const each of FAILURE_CONSEQUENCES) {
      const column = SAFETY_COSTS.map((cost) => TARGET_RELIABILITY[cost][each]);
      expect(column).toEqual([...column].sort());
    }
  });

  it('rests on scatter with a source', () => {
    expect(new Set(TYPICAL_SCATTER.map(({ key }) => key)).size).toBe(TYPICAL_SCATTER.length);
    for (const { cov, source } of TYPICAL_SCATTER) {
      expect(cov).toBeGreaterThan(0);
      expect(source).toMatch(/JCSS/);
    }
  });
});

describe('first-order reliability', () => {
  it('is exact for a linear limit of normal variables, on either side of failure', () => {
    fc.assert(
      fc.property(
        between(-200, 200),
        between(1, 40),
        between(-200, 200),
        between(1, 40),
        (mr, sr, ms, ss) => {
          const answer = form({
            ...LINEAR,
            variables: [variable('r', normal(mr, sr)), variable('s', normal(ms, ss))],
          });
          const exact = normalIndex({ mean: mr, sd: sr }, { mean: ms, sd: ss });
          expect(Math.abs(answer.beta - exact)).toBeLessThan(1e-6 * (1 + Math.abs(exact)));
        },
      ),
    );
  });

  it('is exact for a quotient of lognormal variables', () => {
    const answer = form({
      ...LINEAR,
      variables: [variable('r', lognormal(120, 0.2)), variable('s', lognormal(70, 0.15))],
    });
    const exact = lognormalIndex({ mean: 120, cov: 0.2 }, { mean: 70, cov: 0.15 });
    expect(answer.beta).toBeCloseTo(exact, 6);
  });

  it('says which variable drives the failure: the shares add up to 1', () => {
    const { sensitivities, designPoint, beta } = form(LINEAR);
    expect(sensitivities.reduce((sum, { importance }) => sum + importance, 0)).toBeCloseTo(1, 9);
    expect(sensitivities[0]?.importance).toBeCloseTo(225 / 325, 6);
    expect(sensitivities[0]?.alpha).toBeLessThan(0);
    expect(sensitivities[1]?.alpha).toBeGreaterThan(0);
    expect(Math.hypot(...designPoint)).toBeCloseTo(beta, 6);
    expect(sensitivities[0]?.designValue).toBeCloseTo(sensitivities[1]?.designValue ?? 0, 6);
  });

  it('finds the nearest point of a curved limit, here a parabola', () => {
    const answer = form({
      variables: [variable('x', normal(0, 1)), variable('y', normal(0, 1))],
      margin: (x) => 3 + 0.1 * at(x, 0) ** 2 - at(x, 1),
    });
    expect(answer.beta).toBeCloseTo(3, 6);
  });

  it('finds the point where the plain iteration goes round in circles', () => {
    const answer = form({
      variables: [variable('x', normal(10, 5)), variable('y', normal(9.9, 5))],
      margin: (x) => at(x, 0) ** 3 + at(x, 1) ** 3 - 18,
    });
    // distance by a separate constrained minimisation
    expect(answer.beta).toBeCloseTo(2.225988, 5);
    const [x = 0, y = 0] = answer.sensitivities.map(({ designValue }) => designValue);
    expect(x ** 3 + y ** 3).toBeCloseTo(18, 5);
  });

  it('says so when there is no failure to be found, or no number', () => {
    const variables = [variable('x', normal(0, 1))];
    expect(firstOrderReliability({ variables, margin: () => 1 }).status).toBe('no failure found');
    expect(firstOrderReliability({ variables, margin: () => Number.NaN }).status).toBe(
      'not a number',
    );
    expect(firstOrderReliability({ variables: [], margin: () => 1 }).status).toBe('refused');
    expect(
      firstOrderReliability({ variables, margin: (x) => 2 + Math.cos(at(x, 0)) }).status,
    ).not.toBe('converged');
  });

  it('gives a failure probability that rises with the load', () => {
    const pf = (load: number) =>
      form({ ...LINEAR, variables: [RESISTANCE, variable('load', normal(load, 10))] })
        .failureProbability;
    fc.assert(
      fc.property(between(0, 90), between(0.1, 30), (load, more) => {
        expect(pf(load + more)).toBeGreaterThan(pf(load));
      }),
    );
  });
});

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

describe('conditioning on toughness', () => {
  const toughness = weibull({ minimum: 20, characteristic: 120, shape: 4 });
  const conditional = {
    variables: [variable('k', normal(60, 8))],
    probability: (x: Float64Array) => toughness.below(at(x, 0)),
  };
  const crude = {
    variables: [...conditional.variables, variable('kmat', toughness)],
    margin: (x: Float64Array) => at(x, 1) - at(x, 0),
  };

  it('agrees with crude sampling and with integration, with far less error', () => {
    const integrated = integrateConditional(conditional);
    const few = conditionalFailureProbability(conditional, { samples: 2048, seed: 1 });
    const many = failureProbability(crude, { samples: 200_000, seed: 1 });
    if (integrated.status === 'refused' || few.status === 'refused' || many.status === 'refused')
      throw new Error('refused');
    expect(integrated.gridError).toBeLessThan(1e-9);
    expect(Math.abs(few.probability - integrated.probability)).toBeLessThan(
      4 * few.standardError + 1e-12,
    );
    expect(Math.abs(many.probability - integrated.probability)).toBeLessThan(
      4 * many.standardError,
    );
    expect(few.standardError).toBeLessThan(many.standardError);
  });

  it('fails for certain at the cut-off and never without K', () => {
    const place = { k: 50, lr: 0.5, lrMax: 1.2, line: 0.8 };
    expect(failureGivenPlace(place, toughness)).toBeCloseTo(toughness.below(62.5), 12);
    expect(failureGivenPlace({ ...place, lr: 1.2 }, toughness)).toBe(1);
    expect(failureGivenPlace({ ...place, line: 0 }, toughness)).toBe(1);
    expect(failureGivenPlace({ ...place, lr: Number.NaN }, toughness)).toBe(1);
    expect(failureGivenPlace({ ...place, k: 0 }, toughness)).toBe(0);
  });

  it('never falls with the load', () => {
    fc.assert(
      fc.property(between(1, 300), between(0, 50), (k, more) => {
        const place = { lr: 0.4, lrMax: 1.2, line: 0.9 };
        expect(failureGivenPlace({ ...place, k: k + more }, toughness)).toBeGreaterThanOrEqual(
          failureGivenPlace({ ...place, k }, toughness),
        );
      }),
    );
  });

  it('is not integrated over more than three variables, nor where it is no number', () => {
    const four = Array.from({ length: 4 }, (_, i) => variable(`x${i}`, normal(0, 1)));
    expect(integrateConditional({ variables: four, probability: () => 0 }).status).toBe('refused');
    const broken = { ...conditional, probability: () => Number.NaN };
    expect(integrateConditional(broken).status).toBe('refused');
  });
});

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
