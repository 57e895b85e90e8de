import { lrMax, optionOne } from '../../fracture/fad/option-one';
import { plateSurfaceReference } from '../../fracture/reference-stress/plate-surface-reference';
import { PLATE_SURFACE_K } from '../../fracture/stress-intensity/plate-surface-k';
import { failureGivenPlace, type DiagramPlace } from '../../probability/conditional-on-toughness';
import type { Distribution, RandomVariable } from '../../probability/distributions/distribution';
import { lognormal } from '../../probability/distributions/lognormal';
import { normal } from '../../probability/distributions/normal';
import { weibull } from '../../probability/distributions/weibull';
import type {
  ConditionalFailure,
  LimitState,
} from '../../probability/sampling/failure-probability';
import { mpa } from '../../units/quantity';
import { crackOf, kOf } from '../crack-of';

/** A case as a whole limit state, toughness last, and as one conditional on the toughness. */
export interface ToughnessCase {
  readonly whole: LimitState;
  readonly conditional: ConditionalFailure;
}

const variable = (name: string, distribution: Distribution): RandomVariable => ({
  name,
  distribution,
});
const at = (sample: Float64Array, i: number) => sample[i] as number;
const toughnessOf = (characteristic: number) => weibull({ minimum: 20, characteristic, shape: 4 });

/** Toughness against K = 1.12 S √(πa), without collapse [MPa·√m]. */
export function edgeCrackCase(
  characteristic: number,
  stress: readonly [mean: number, sd: number],
  depth: readonly [mean: number, cov: number],
): ToughnessCase {
  const toughness = toughnessOf(characteristic);
  const variables = [variable('stress', normal(...stress)), variable('a', lognormal(...depth))];
  const k = (x: Float64Array) => 1.12 * at(x, 0) * Math.sqrt((Math.PI * at(x, 1)) / 1000);
  return {
    whole: {
      variables: [...variables, variable('Kmat', toughness)],
      margin: (x) => at(x, 2) - k(x),
    },
    conditional: { variables, probability: (x) => toughness.below(k(x)) },
  };
}

/** The diagram for a surface flaw 60 mm long in a plate 25 mm thick: depth, stress, yield, toughness. */
export function diagramCase(characteristic: number, meanStress: number, sd: number): ToughnessCase {
  const toughness = toughnessOf(characteristic);
  const variables = [
    variable('a', normal(8, 1)),
    variable('stress', normal(meanStress, sd)),
    variable('yield', lognormal(380, 0.07)),
  ];
  const margin = (x: Float64Array) => {
    const { k, lr, lrMax: cutOff, line } = placeOf(x);
    // past the cut-off the margin goes on falling, so that its slope leads back
    return lr < cutOff ? line - k / at(x, 3) : cutOff - lr;
  };
  return {
    whole: { variables: [...variables, variable('Kmat', toughness)], margin },
    conditional: {
      variables,
      probability: (x) => failureGivenPlace(placeOf(x), toughness),
    },
  };
}

function placeOf(x: Float64Array): DiagramPlace {
  const [a, stress, yieldMPa] = [at(x, 0), at(x, 1), at(x, 2)];
  const symbols = { a, c: 30, t: 25, W: 500 };
  const material = {
    yieldMPa,
    tensileMPa: 1.35 * yieldMPa,
    youngsModulusMPa: 207_000,
    yieldPlateau: false,
  };
  const lr = plateSurfaceReference(crackOf(symbols), mpa(stress), mpa(0)) / yieldMPa;
  return {
    k: kOf(PLATE_SURFACE_K, symbols, 90, stress) / Math.sqrt(1000),
    lr,
    lrMax: lrMax(material),
    line: optionOne(lr, material),
  };
}
