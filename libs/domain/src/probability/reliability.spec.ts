import fc from 'fast-check';
import type { Distribution } from './distributions/distribution';
import { lognormal } from './distributions/lognormal';
import { normal } from './distributions/normal';
import { firstOrderReliability } from './form/first-order-reliability';
import {
  failureProbabilityOf,
  lognormalIndex,
  normalIndex,
  reliabilityIndex,
} from './reliability-index';
import { FAILURE_CONSEQUENCES, SAFETY_COSTS, TARGET_RELIABILITY } from './target-reliability';
import { TYPICAL_SCATTER } from './typical-scatter';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
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
          const exact = normalIndex({ mean: mr, sd: sr }, { mean: ms, sd: ss });
          fc.pre(Math.abs(exact) < 30);
          const answer = form({
            ...LINEAR,
            variables: [variable('r', normal(mr, sr)), variable('s', normal(ms, ss))],
          });
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

describe('first-order reliability where the margin is awkward', () => {
  it('bears a margin that is no number far from the mean', () => {
    // the depth is negative beyond eight standard deviations, and its root no number
    const answer = form({
      variables: [variable('a', normal(8, 1)), variable('load', normal(200, 20))],
      margin: (x) => 60 - 0.1 * at(x, 1) * Math.sqrt(at(x, 0)),
    });
    expect(
      0.1 *
        (answer.sensitivities[1]?.designValue ?? 0) *
        Math.sqrt(answer.sensitivities[0]?.designValue ?? 0),
    ).toBeCloseTo(60, 5);
  });

  it('bears a margin that is flat about the mean', () => {
    const answer = form({
      variables: [variable('x', normal(0, 1))],
      margin: (x) => 4 - Math.max(at(x, 0), -1) ** 3 / 16,
    });
    expect(answer.beta).toBeCloseTo(4, 5);
  });
});
