import type { InteractionRule, PlacedFlaw } from './interaction-rules';

/** How two flaws lie to each other. */
export type Arrangement = 'side by side' | 'one above the other';

/** Whether two flaws count as one, and by how much. */
export interface Interaction {
  readonly interacts: boolean;
  readonly arrangement: Arrangement;
  /** Gap that decides [mm]; 0 when they touch or overlap. */
  readonly gapMm: number;
  readonly limitMm: number;
  /** Distance of the two planes against what the rule takes as one plane [mm]. */
  readonly planesMm: number;
  readonly planesLimitMm: number;
}

/** Upper and lower end of a flaw through the wall, from the face [mm]. */
export function extentThrough({ kind, a, ligamentMm }: PlacedFlaw): readonly [number, number] {
  return kind === 'surface' ? [0, a] : [ligamentMm, ligamentMm + 2 * a];
}

/** Gap of two ranges; 0 when they touch or overlap. */
const gap = ([fromA, toA]: readonly [number, number], [fromB, toB]: readonly [number, number]) =>
  Math.max(fromB - toA, fromA - toB, 0);

const extentAlong = ({ positionMm, c }: PlacedFlaw) => [positionMm - c, positionMm + c] as const;

/** Holds two flaws against a rule. Flaws that overlap in both views count as one whatever their limits. */
export function interacts(one: PlacedFlaw, other: PlacedFlaw, rule: InteractionRule): Interaction {
  const along = gap(extentAlong(one), extentAlong(other));
  const across = gap(extentThrough(one), extentThrough(other));
  const planesMm = Math.abs(one.planeMm - other.planeMm);
  const planesLimitMm = rule.planeLimit(one, other);
  const samePlane = planesMm <= planesLimitMm;
  const [alongLimit, acrossLimit] = [rule.alongLimit(one, other), rule.acrossLimit(one, other)];
  const above = across > 0;
  return {
    // both gaps count: flaws far apart along the wall do not meet through it, and the other way about
    interacts: samePlane && along <= alongLimit && across <= acrossLimit,
    arrangement: above ? 'one above the other' : 'side by side',
    gapMm: above ? across : along,
    limitMm: above ? acrossLimit : alongLimit,
    planesMm,
    planesLimitMm,
  };
}

/** The one flaw that encloses two: from end to end, and from the uppermost to the lowest point. */
export function combined(one: PlacedFlaw, other: PlacedFlaw): PlacedFlaw {
  const [left, right] = [
    Math.min(one.positionMm - one.c, other.positionMm - other.c),
    Math.max(one.positionMm + one.c, other.positionMm + other.c),
  ];
  const [top, bottom] = [
    Math.min(extentThrough(one)[0], extentThrough(other)[0]),
    Math.max(extentThrough(one)[1], extentThrough(other)[1]),
  ];
  const surface = one.kind === 'surface' || other.kind === 'surface';
  return {
    name: [one.name, other.name].sort().join(' + '),
    kind: surface ? 'surface' : 'embedded',
    a: surface ? bottom : (bottom - top) / 2,
    c: (right - left) / 2,
    ligamentMm: surface ? 0 : top,
    positionMm: (left + right) / 2,
    planeMm: (one.planeMm + other.planeMm) / 2,
  };
}
