/** A flaw as the rules of interaction see it: its size and its place in the wall [mm]. */
export interface PlacedFlaw {
  readonly name: string;
  readonly kind: 'surface' | 'embedded';
  /** Depth of a surface flaw, half height of an embedded one. */
  readonly a: number;
  /** Half length. */
  readonly c: number;
  /** From the face to the flaw; 0 for a surface flaw. */
  readonly ligamentMm: number;
  /** Centre along the wall. */
  readonly positionMm: number;
  /** Distance of its plane from a common one. */
  readonly planeMm: number;
}

/** A published rule: how near two flaws must be to count as one [mm]. */
export interface InteractionRule {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** Largest gap along the wall of two flaws in one plane, both at the face or both inside. */
  readonly alongLimit: (one: PlacedFlaw, other: PlacedFlaw) => number;
  /** Largest gap through the wall of two flaws one above the other. */
  readonly acrossLimit: (one: PlacedFlaw, other: PlacedFlaw) => number;
  /** Largest distance of two planes that count as one. */
  readonly planeLimit: (one: PlacedFlaw, other: PlacedFlaw) => number;
}

const deep = ({ a, c }: PlacedFlaw): boolean => a > c;
const heightOf = ({ kind, a }: PlacedFlaw): number => (kind === 'surface' ? a : 2 * a);
const stacked = (one: PlacedFlaw, other: PlacedFlaw): number => one.a + other.a;
const shorter = (one: PlacedFlaw, other: PlacedFlaw): number => 2 * Math.min(one.c, other.c);
const deeper = (one: PlacedFlaw, other: PlacedFlaw): number =>
  0.5 * Math.max(heightOf(one), heightOf(other));

/** ASME XI takes planes within this distance as one (from memory) [mm]. */
const ASME_PLANES = 12.7;

/** The rules, the one that is taken by default first. */
export const INTERACTION_RULES: readonly [InteractionRule, ...InteractionRule[]] = [
  {
    key: 'bs-2013',
    title: 'BS 7910:2013, R6 and FITNET',
    source: 'BS 7910:2013, R6 and FITNET (from memory); one above the other: SINTAP',
    alongLimit: (one, other) =>
      deep(one) || deep(other) ? shorter(one, other) : Math.max(0.5 * one.a, 0.5 * other.a),
    acrossLimit: stacked,
    planeLimit: (one, other) =>
      deep(one) || deep(other) ? shorter(one, other) : Math.max(0.5 * one.a, 0.5 * other.a),
  },
  {
    key: 'bs-2005',
    title: 'BS 7910:2005 and SINTAP',
    source: 'SINTAP planar flaw interaction, as given in the ESIS monograph IFMASS 10',
    alongLimit: (one, other) => (deep(one) || deep(other) ? shorter(one, other) : 0),
    acrossLimit: stacked,
    planeLimit: (one, other) => (deep(one) || deep(other) ? shorter(one, other) : 0),
  },
  {
    key: 'api-579',
    title: 'API 579-1 Part 9',
    source: 'API 579-1 Part 9 (from memory)',
    alongLimit: (one, other) => one.c + other.c,
    acrossLimit: stacked,
    planeLimit: (one, other) => one.c + other.c,
  },
  {
    key: 'asme-xi',
    title: 'ASME XI IWA-3300',
    source: 'ASME XI IWA-3300 (from memory; editions differ)',
    alongLimit: deeper,
    acrossLimit: deeper,
    planeLimit: () => ASME_PLANES,
  },
];

/** The rule of a key; the default where the key is not known. */
export const interactionRule = (key: string | null): InteractionRule =>
  INTERACTION_RULES.find((rule) => rule.key === key) ?? INTERACTION_RULES[0];
