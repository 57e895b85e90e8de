import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { failureProbabilityOf } from '../reliability-index';
import type { LimitState } from '../sampling/failure-probability';
import { searchDesignPoint, type DesignPointSearch } from './search-design-point';
import { dot, standardSpace } from './standard-space';

/** What one variable does to the failure probability. */
export interface Sensitivity {
  readonly name: string;
  /** Value at the design point, in the unit of the variable. */
  readonly designValue: number;
  /** Standard normal coordinate of the design point. */
  readonly designNormal: number;
  /** Direction cosine α: above 0 when a larger value leads to failure. */
  readonly alpha: number;
  /** Share α² of the variance; all add up to 1. */
  readonly importance: number;
}

/** First-order reliability: the point of failure nearest to the mean in standard normal space. */
export interface FirstOrderResult {
  readonly status: 'converged';
  /** Reliability index; negative when the mean point has failed. */
  readonly beta: number;
  /** Φ(−β): exact for a plane limit, an approximation otherwise. */
  readonly failureProbability: number;
  readonly sensitivities: readonly Sensitivity[];
  /** Design point in standard normal space, the centre for importance sampling. */
  readonly designPoint: readonly number[];
  readonly iterations: number;
  readonly evaluations: number;
  readonly caution: string;
}

/** No index: how the search ended, in words. */
export interface FirstOrderFailed {
  readonly status: Exclude<DesignPointSearch['status'], 'converged'>;
  readonly because: string;
  readonly iterations: number;
  readonly evaluations: number;
}

const CAUTION =
  'First order: the curvature of the limit and further design points are left out. Confirm by sampling around the design point.';

const BECAUSE: Readonly<Record<FirstOrderFailed['status'], string>> = {
  'iteration limit': 'The search for the design point did not settle; sample instead.',
  'no failure found': 'No failure was found within twelve standard deviations of the mean.',
  'not a number': 'The margin is no number on the way; narrow the distributions.',
};

/** Reliability index, design point and importance of independent variables. */
export function firstOrderReliability(
  state: LimitState,
): FirstOrderResult | FirstOrderFailed | Refused {
  const refusals = outOfBounds([
    {
      input: 'variables',
      name: 'Number of random variables',
      unit: '',
      value: state.variables.length,
      min: 1,
      max: 100,
      instead: 'Give at least one random variable.',
    },
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const space = standardSpace(state);
  const { status, point, direction, iterations } = searchDesignPoint(space);
  const evaluations = space.evaluations();
  if (status !== 'converged') {
    return { status, because: BECAUSE[status], iterations, evaluations };
  }
  const beta = dot(direction, point);
  const values = space.sampleAt(point);
  return {
    status,
    beta,
    failureProbability: failureProbabilityOf(beta),
    sensitivities: state.variables.map(({ name }, k) => ({
      name,
      designValue: values[k] as number,
      designNormal: point[k] as number,
      alpha: direction[k] as number,
      importance: (direction[k] as number) ** 2,
    })),
    designPoint: [...point],
    iterations,
    evaluations,
    caution: CAUTION,
  };
}
