import fc from 'fast-check';
import type { Distribution } from '../distributions/distribution';
import { gumbel } from '../distributions/gumbel';
import { lognormal } from '../distributions/lognormal';
import { normal } from '../distributions/normal';
import { weibull } from '../distributions/weibull';
import type { LimitState } from '../sampling/failure-probability';
import { firstOrderReliability } from './first-order-reliability';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const variable = (name: string, distribution: Distribution) => ({ name, distribution });
const at = (x: Float64Array, i: number) => x[i] ?? Number.NaN;

function form(state: LimitState) {
  const answer = firstOrderReliability(state);
  if (answer.status !== 'converged') throw new Error(answer.status);
  return answer;
}

const TOUGHNESS = variable('Kmat', weibull({ minimum: 20, characteristic: 160, shape: 4 }));
const STRESS = variable('stress', gumbel(120, 15));
const DEPTH = variable('a', lognormal(5, 0.25));
const k = (x: Float64Array) => 1.12 * at(x, 1) * Math.sqrt((Math.PI * at(x, 2)) / 1000);
const CRACK: LimitState = {
  variables: [TOUGHNESS, STRESS, DEPTH],
  margin: (x) => at(x, 0) - k(x),
};

describe('the laws of first-order reliability', () => {
  it('give the same index however the same limit is written', () => {
    const { beta } = form(CRACK);
    const ways: readonly LimitState['margin'][] = [
      (x) => 1000 * (at(x, 0) - k(x)),
      (x) => 1 - k(x) / at(x, 0),
      (x) => Math.log(at(x, 0) / k(x)),
    ];
    for (const margin of ways) expect(form({ ...CRACK, margin }).beta).toBeCloseTo(beta, 6);
  });

  it('give a variable that does not matter no importance', () => {
    const idle = { ...CRACK, variables: [...CRACK.variables, variable('idle', normal(0, 1))] };
    const answer = form(idle);
    expect(answer.sensitivities[3]?.importance).toBeCloseTo(0, 12);
    expect(answer.beta).toBeCloseTo(form(CRACK).beta, 6);
  });

  it('do not depend on the order of the variables', () => {
    const turned: LimitState = {
      variables: [DEPTH, STRESS, TOUGHNESS],
      margin: (x) => CRACK.margin(Float64Array.of(at(x, 2), at(x, 1), at(x, 0))),
    };
    expect(form(turned).beta).toBeCloseTo(form(CRACK).beta, 6);
  });

  it('put the design point on the limit, as far away as the index says', () => {
    const { beta, designPoint, sensitivities } = form(CRACK);
    expect(Math.hypot(...designPoint)).toBeCloseTo(beta, 6);
    const values = Float64Array.from(sensitivities, ({ designValue }) => designValue);
    expect(CRACK.margin(values)).toBeCloseTo(0, 5);
    expect(sensitivities.reduce((sum, { importance }) => sum + importance, 0)).toBeCloseTo(1, 9);
  });

  it('change sign with the margin', () => {
    fc.assert(
      fc.property(between(-3, 3), between(0.2, 3), (shift, slope) => {
        const variables = [variable('x', normal(0, 1)), variable('y', normal(0, 1))];
        const margin = (x: Float64Array) => shift + slope * at(x, 0) - at(x, 1);
        const [one, other] = [margin, (x: Float64Array) => -margin(x)].map(
          (each) => form({ variables, margin: each }).beta,
        );
        expect((one ?? 0) + (other ?? 9)).toBeCloseTo(0, 6);
      }),
    );
  });

  it('let more stress, more depth and less toughness only raise the failure probability', () => {
    fc.assert(
      fc.property(between(1, 1.5), between(1, 1.5), between(0.7, 1), (s, a, t) => {
        const worse: LimitState = {
          ...CRACK,
          margin: (x) => CRACK.margin(Float64Array.of(t * at(x, 0), s * at(x, 1), a * at(x, 2))),
        };
        expect(form(worse).beta).toBeLessThanOrEqual(form(CRACK).beta + 1e-7);
      }),
    );
  });
});
