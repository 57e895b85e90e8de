/** A random input as a person gives it; every number carries the unit of its quantity. */
export type VariableSpec =
  | { readonly kind: 'normal'; readonly mean: number; readonly sd: number }
  | { readonly kind: 'lognormal'; readonly mean: number; readonly cov: number }
  | {
      readonly kind: 'weibull';
      readonly minimum: number;
      /** Value exceeded with probability 1/e; K0 of the master curve. */
      readonly characteristic: number;
      readonly shape: number;
    }
  | { readonly kind: 'exponential'; readonly mean: number }
  | { readonly kind: 'uniform'; readonly low: number; readonly high: number }
  | { readonly kind: 'gumbel'; readonly mean: number; readonly sd: number };

export const VARIABLE_KINDS = [
  'normal',
  'lognormal',
  'weibull',
  'exponential',
  'uniform',
  'gumbel',
] as const satisfies readonly VariableSpec['kind'][];
