import type { HigherInfluence, Influence } from './solution';

/**
 * A stress through the wall, x from the flawed face [MPa]:
 * σ(x) = membrane + bending (1 − 2x/t) + quadratic (x/t)² + cubic (x/t)³ + quartic (x/t)⁴.
 */
export interface StressTerms {
  readonly membrane: number;
  readonly bending: number;
  readonly quadratic: number;
  readonly cubic: number;
  readonly quartic: number;
}

/** A stress that is membrane and bending only. */
export const linearTerms = (membrane: number, bending: number): StressTerms => ({
  membrane,
  bending,
  quadratic: 0,
  cubic: 0,
  quartic: 0,
});

/** Whether a stress is more than membrane and bending. */
export const isCurved = ({ quadratic, cubic, quartic }: StressTerms): boolean =>
  quadratic !== 0 || cubic !== 0 || quartic !== 0;

/** The terms of a polynomial Σ sₙ (x/t)ⁿ of at most the fourth degree [MPa]. */
export function termsOf(profile: readonly number[]): StressTerms {
  const [s0 = 0, s1 = 0, quadratic = 0, cubic = 0, quartic = 0] = profile;
  return { membrane: s0 + s1 / 2, bending: -s1 / 2, quadratic, cubic, quartic };
}

/** The polynomial of given terms, lowest degree first [MPa]. */
export const profileOf = (terms: StressTerms): readonly number[] => [
  terms.membrane + terms.bending,
  -2 * terms.bending,
  terms.quadratic,
  terms.cubic,
  terms.quartic,
];

/** Stress at the relative depth u = x/t [MPa]. */
export const stressAt = (terms: StressTerms, u: number): number =>
  terms.membrane +
  terms.bending * (1 - 2 * u) +
  u * u * (terms.quadratic + u * (terms.cubic + u * terms.quartic));

/**
 * Membrane and bending with the same force and moment: Pm = ∫σ du, Pb = 6 ∫σ (1/2 − u) du over the wall
 * (linearisation of BS 7910 and API 579-1, exact for the polynomial).
 */
export function linearised(terms: StressTerms): StressTerms {
  const { membrane, bending, quadratic, cubic, quartic } = terms;
  return linearTerms(
    membrane + quadratic / 3 + cubic / 4 + quartic / 5,
    bending - quadratic / 2 - (9 * cubic) / 20 - (2 * quartic) / 5,
  );
}

/** The same stress seen from the other face: u becomes 1 − u. */
export function fromOtherFace({ membrane, bending, quadratic, cubic, quartic }: StressTerms) {
  // binomial coefficients of (1 − u)ⁿ, sorted by power
  return termsOf([
    membrane - bending + quadratic + cubic + quartic,
    2 * bending - 2 * quadratic - 3 * cubic - 4 * quartic,
    quadratic + 3 * cubic + 6 * quartic,
    -cubic - 4 * quartic,
    quartic,
  ]);
}

/** Every term times a factor. */
export const scaled = (terms: StressTerms, factor: number): StressTerms => ({
  membrane: factor * terms.membrane,
  bending: factor * terms.bending,
  quadratic: factor * terms.quadratic,
  cubic: factor * terms.cubic,
  quartic: factor * terms.quartic,
});

const SAMPLES = 32;

/** Highest stress between two relative depths, of even samples that include both ends [MPa]. */
export function highestBetween(terms: StressTerms, from: number, to: number): number {
  let highest = stressAt(terms, from);
  for (let i = 1; i <= SAMPLES; i++) {
    highest = Math.max(highest, stressAt(terms, from + ((to - from) * i) / SAMPLES));
  }
  return highest;
}

/** K of every term together [MPa·√mm]; compression closes the crack, K is then 0. */
export function kOfTerms(
  influence: Influence,
  higher: HigherInfluence,
  terms: StressTerms,
): number {
  const { bending } = terms;
  const bent = bending >= 0 ? bending * influence.bending : -bending * influence.reversedBending;
  const curved =
    terms.quadratic * higher.quadratic +
    terms.cubic * higher.cubic +
    terms.quartic * higher.quartic;
  return Math.max(terms.membrane * influence.membrane + bent + curved, 0);
}
