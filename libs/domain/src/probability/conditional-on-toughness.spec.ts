import fc from 'fast-check';
import { failureGivenPlace } from './conditional-on-toughness';
import type { Distribution } from './distributions/distribution';
import { normal } from './distributions/normal';
import { weibull } from './distributions/weibull';
import { integrateConditional } from './integrate-conditional';
import { conditionalFailureProbability, failureProbability } from './sampling/failure-probability';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const variable = (name: string, distribution: Distribution) => ({ name, distribution });
const at = (sample: Float64Array, i: number) => sample[i] ?? Number.NaN;

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
