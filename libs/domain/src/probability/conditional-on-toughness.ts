import type { Distribution } from './distributions/distribution';

/** One place of the front on the diagram: K, the load ratio, the height of the line there and its cut-off. */
export interface DiagramPlace {
  /** K with its interaction, in the unit of the toughness. */
  readonly k: number;
  readonly lr: number;
  readonly lrMax: number;
  readonly line: number;
}

/**
 * Probability of failure given everything but the toughness: P(Kmat < K/f(Lr)), by total probability over
 * Kmat; 1 at or beyond the cut-off, where no toughness would do.
 */
export function failureGivenPlace(
  { k, lr, lrMax, line }: DiagramPlace,
  toughness: Distribution,
): number {
  if (!(lr < lrMax) || !(line > 0)) return 1;
  return k > 0 ? toughness.below(k / line) : 0;
}
