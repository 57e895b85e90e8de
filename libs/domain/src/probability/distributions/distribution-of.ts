import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import type { Distribution } from './distribution';
import { gumbel } from './gumbel';
import { lognormal } from './lognormal';
import { normal } from './normal';
import { uniform } from './uniform';
import type { VariableSpec } from './variable-spec';
import { exponential, weibull } from './weibull';

/** A distribution made from what a person gave, or the reasons why none can be. */
export type DistributionOutcome =
  { readonly status: 'made'; readonly distribution: Distribution } | Refused;

const LARGEST = 1e12;
const SHARE = 'Give the coefficient of variation as a share: 7 % is 0.07.';
const SAME_UNIT = 'Give it in the unit of the quantity.';
const SWAPPED = 'The two bounds may be swapped.';

/** The distribution of a random input; `name` is the path of the input, for the refusal. */
export function distributionOf(name: string, spec: VariableSpec): DistributionOutcome {
  const refusals = outOfBounds(rulesOf(name, spec));
  return refusals.length > 0 ? refused(...refusals) : { status: 'made', distribution: make(spec) };
}

function make(spec: VariableSpec): Distribution {
  switch (spec.kind) {
    case 'normal':
      return normal(spec.mean, spec.sd);
    case 'lognormal':
      return lognormal(spec.mean, spec.cov);
    case 'weibull':
      return weibull(spec);
    case 'exponential':
      return exponential(spec.mean);
    case 'uniform':
      return uniform(spec.low, spec.high);
    case 'gumbel':
      return gumbel(spec.mean, spec.sd);
  }
}

function rulesOf(name: string, spec: VariableSpec): readonly NumberRule[] {
  const any = rule(name, -LARGEST);
  const above = (key: string, value: number, from = 0, instead = SAME_UNIT) =>
    rule(name, from, true)(key, value, instead);
  switch (spec.kind) {
    case 'normal':
    case 'gumbel':
      return [any('mean', spec.mean), above('sd', spec.sd)];
    case 'lognormal':
      return [above('mean', spec.mean), { ...above('cov', spec.cov, 0, SHARE), max: 5 }];
    case 'weibull':
      return [
        any('minimum', spec.minimum),
        above('characteristic', spec.characteristic, finite(spec.minimum), SWAPPED),
        { ...above('shape', spec.shape, 0.1), max: 1000 },
      ];
    case 'exponential':
      return [above('mean', spec.mean)];
    case 'uniform':
      return [any('low', spec.low), above('high', spec.high, finite(spec.low), SWAPPED)];
  }
}

// the other bound is refused by itself when it is no number
const finite = (value: number) => (Number.isFinite(value) ? value : -LARGEST);

const rule =
  (name: string, min: number, isAbove = false) =>
  (key: string, value: number, instead = SAME_UNIT): NumberRule => ({
    input: `${name}.${key}`,
    name: `${key} of ${name}`,
    unit: '',
    value,
    min,
    max: LARGEST,
    above: isAbove,
    instead,
  });
