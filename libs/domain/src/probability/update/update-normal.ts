import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';

/** A size, a rate or another quantity as it is known: mean and standard deviation in one unit. */
export interface Belief {
  readonly mean: number;
  readonly sd: number;
}

/** The belief after a measurement. */
export interface UpdatedBelief extends Belief {
  readonly status: 'updated';
  /** Share of the measurement in the new mean; the rest comes from what was believed. */
  readonly weight: number;
  /** Distance of the measurement from what was expected, in standard deviations of their difference. */
  readonly surprise: number;
  /** Set when prior and measurement hardly fit together. */
  readonly caution: string | null;
}

const SURPRISING = 3;
const CONFLICT =
  'The measurement lies more than three standard deviations from what was expected: check that it is the same flaw before the two are combined.';

/**
 * Combines what was believed with a measurement, both normal: the mean weighted by the inverse variances. The
 * standard deviation never grows.
 */
export function updateNormal(prior: Belief, measurement: Belief): UpdatedBelief | Refused {
  const refusals = outOfBounds([...rules('prior', prior), ...rules('measurement', measurement)]);
  if (refusals.length > 0) return refused(...refusals);
  const [p, m] = [prior.sd * prior.sd, measurement.sd * measurement.sd];
  const weight = p / (p + m);
  const surprise = (measurement.mean - prior.mean) / Math.hypot(prior.sd, measurement.sd);
  return {
    status: 'updated',
    mean: prior.mean + weight * (measurement.mean - prior.mean),
    sd: prior.sd * Math.sqrt(m / (p + m)),
    weight,
    surprise,
    caution: Math.abs(surprise) > SURPRISING ? CONFLICT : null,
  };
}

const rules = (path: string, { mean, sd }: Belief): readonly NumberRule[] => [
  { ...COMMON, input: `${path}.mean`, name: `Mean of the ${path}`, value: mean, min: -1e9 },
  {
    ...COMMON,
    input: `${path}.sd`,
    name: `Standard deviation of the ${path}`,
    value: sd,
    min: 0,
    above: true,
  },
];

const COMMON = {
  unit: '',
  max: 1e9,
  instead: 'Give prior and measurement in the same unit, each with a standard deviation above 0.',
} as const;
