import { outOfBounds, refused, type NumberRule, type Refused } from '../refusal';
import type { InteractionRule, PlacedFlaw } from './interaction-rules';
import { combined, interacts, type Interaction } from './interacts';

/** One combination, as it was made. */
export interface CombinationStep extends Interaction {
  readonly flaws: readonly [string, string];
  readonly into: PlacedFlaw;
  readonly rule: string;
}

/** Flaws after combination, and how they came about. */
export interface CombinedFlaws {
  readonly status: 'combined';
  readonly flaws: readonly PlacedFlaw[];
  readonly steps: readonly CombinationStep[];
}

export interface CombineOptions {
  /** Holds only flaws as found against each other, not combined ones (some editions); the default goes on. */
  readonly originalDimensionsOnly?: boolean;
}

/**
 * Combines flaws two at a time until no two interact. The pair that is nearest against its limit goes first,
 * so that the order of the list does not matter.
 */
export function combineFlaws(
  flaws: readonly PlacedFlaw[],
  rule: InteractionRule,
  { originalDimensionsOnly = false }: CombineOptions = {},
): CombinedFlaws | Refused {
  const broken = outOfBounds(flaws.flatMap(rulesOf));
  if (broken.length > 0) return refused(...broken);
  let left: readonly Group[] = flaws.map((flaw) => ({ whole: flaw, parts: [flaw] }));
  const steps: CombinationStep[] = [];
  for (;;) {
    const next = nearestPair(left, rule, originalDimensionsOnly);
    if (!next) return { status: 'combined', flaws: left.map(({ whole }) => whole), steps };
    const { one, other, interaction } = next;
    const into = combined(one.whole, other.whole);
    steps.push({ ...interaction, flaws: [one.whole.name, other.whole.name], into, rule: rule.key });
    const group = { whole: into, parts: [...one.parts, ...other.parts] };
    left = [...left.filter((each) => each !== one && each !== other), group];
  }
}

/** Flaws that count as one, with those it was made from. */
interface Group {
  readonly whole: PlacedFlaw;
  readonly parts: readonly PlacedFlaw[];
}

interface Pair {
  readonly one: Group;
  readonly other: Group;
  readonly interaction: Interaction;
}

function nearestPair(
  groups: readonly Group[],
  rule: InteractionRule,
  originalOnly: boolean,
): Pair | null {
  const pairs = groups.flatMap((one, i) =>
    groups.slice(i + 1).flatMap((other) => {
      const [first, second] = inOrder(one, other);
      const interaction = meeting(first, second, rule, originalOnly);
      return interaction ? [{ one: first, other: second, interaction }] : [];
    }),
  );
  return pairs.sort(nearerFirst)[0] ?? null;
}

/** How two groups meet: as wholes, or by any two of the flaws they were made from. */
function meeting(
  one: Group,
  other: Group,
  rule: InteractionRule,
  originalOnly: boolean,
): Interaction | null {
  const [ours, theirs] = originalOnly ? [one.parts, other.parts] : [[one.whole], [other.whole]];
  const found = ours.flatMap((a) => theirs.map((b) => interacts(a, b, rule)));
  return found.find((each) => each.interacts) ?? null;
}

// a fixed order for whatever the list's was: by place, then by name
const inOrder = (one: Group, other: Group): readonly [Group, Group] =>
  before(one.whole, other.whole) <= 0 ? [one, other] : [other, one];

const before = (a: PlacedFlaw, b: PlacedFlaw): number =>
  a.positionMm - b.positionMm || a.ligamentMm - b.ligamentMm || a.name.localeCompare(b.name);

const nearerFirst = (a: Pair, b: Pair): number =>
  a.interaction.gapMm - a.interaction.limitMm - (b.interaction.gapMm - b.interaction.limitMm) ||
  before(a.one.whole, b.one.whole) ||
  before(a.other.whole, b.other.whole);

function rulesOf({ name, a, c, ligamentMm, kind }: PlacedFlaw, i: number): readonly NumberRule[] {
  const size = (key: string, words: string, value: number): NumberRule => ({
    input: `flaws.${i}.${key}`,
    name: `${words} of ${name}`,
    unit: 'mm',
    value,
    min: 0,
    max: 1e5,
    above: true,
    instead: 'Give it in millimetres.',
  });
  return [
    size('a', kind === 'surface' ? 'Depth' : 'Half height', a),
    size('c', 'Half length', c),
    ...(kind === 'embedded'
      ? [{ ...size('ligamentMm', 'Ligament', ligamentMm), above: false }]
      : []),
  ];
}
