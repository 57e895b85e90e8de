/** One of two flaws side by side in one plane [mm]. */
export interface NeighbourFlaw {
  readonly a: number;
  /** Half length. */
  readonly c: number;
}

/**
 * A rule of interaction: the gap between the two at or below which they count as one [mm]. Handed in, as
 * the rules differ by standard.
 */
export type InteractionRule = (one: NeighbourFlaw, other: NeighbourFlaw) => number;

/** Gap between the near ends of two flaws whose middles are so far apart; below 0 when they overlap [mm]. */
export const gapBetween = (
  one: NeighbourFlaw,
  other: NeighbourFlaw,
  centreDistance: number,
): number => centreDistance - one.c - other.c;

/** Margin of the event at which two growing flaws join: above 0 apart, 0 at the rule's gap [mm]. */
export const joiningMargin = (
  one: NeighbourFlaw,
  other: NeighbourFlaw,
  centreDistance: number,
  rule: InteractionRule,
): number => gapBetween(one, other, centreDistance) - rule(one, other);

/** The one flaw that two become: as deep as the deeper, as long as from far end to far end. */
export function joined(
  one: NeighbourFlaw,
  other: NeighbourFlaw,
  centreDistance: number,
): NeighbourFlaw {
  const first = Math.min(-one.c, centreDistance - other.c);
  const last = Math.max(one.c, centreDistance + other.c);
  return { a: Math.max(one.a, other.a), c: (last - first) / 2 };
}
