import type { FlawKind, WallShape } from '../geometry/flaw-kind';
import type { Mm } from '../units/quantity';
import { CATALOGUE, type CatalogueEntry } from './catalogue';
import type { ReferenceStressSolution } from './reference-stress/solution';
import type { StressIntensitySolution } from './stress-intensity/solution';
import { withWeldToe } from './stress-intensity/with-weld-toe';

/** What the choice of a solution depends on. */
export interface FlawSituation {
  readonly shape: WallShape;
  readonly kind: FlawKind;
  readonly face: 'inside' | 'outside';
  readonly orientation: 'axial' | 'circumferential';
  readonly flawedSides: 'one' | 'both';
}

/** What may be asked of the choice. */
export interface SolutionWish {
  /** Key of another K solution of the situation; null for the one that governs. */
  readonly stressIntensity: string | null;
  readonly referenceStress: string | null;
  /** Length of the attachment whose toe the flaw starts from; null without one [mm]. */
  readonly attachmentLength: number | null;
}

/** The two solutions a flaw is assessed with. */
export interface ChosenSolutions {
  readonly stressIntensity: StressIntensitySolution;
  readonly referenceStress: ReferenceStressSolution;
}

const NO_WISH: SolutionWish = {
  stressIntensity: null,
  referenceStress: null,
  attachmentLength: null,
};

/** Kinds of flaw that may start from the toe of a weld. */
const AT_TOE: ReadonlySet<FlawKind> = new Set(['surface', 'extended surface']);

/** Name of the situation in the catalogue. */
function placeOf({ shape, kind, face, orientation, flawedSides }: FlawSituation): string {
  if (shape === 'hole edge') return `${shape} ${kind} ${flawedSides}`;
  if (shape !== 'cylinder' || kind === 'embedded') return `${shape} ${kind}`;
  return kind === 'through-wall' ? `${orientation} ${kind}` : `${orientation} ${face} ${kind}`;
}

/** The solutions there are for a situation; undefined where the body cannot hold the flaw. */
export const solutionsFor = (situation: FlawSituation): CatalogueEntry | undefined =>
  (CATALOGUE as Readonly<Record<string, CatalogueEntry>>)[placeOf(situation)];

/**
 * The solutions that govern the situation, or those wished for; a wish for what the situation does not have
 * changes nothing, its check comes before.
 */
export function selectSolutions(
  situation: FlawSituation,
  wish: SolutionWish = NO_WISH,
): ChosenSolutions {
  const entry = solutionsFor(situation);
  if (!entry) throw new RangeError(`no solution for ${placeOf(situation)}`);
  const plain = chosen(entry.stressIntensity, wish.stressIntensity);
  const toe = AT_TOE.has(situation.kind) ? wish.attachmentLength : null;
  return {
    stressIntensity: toe === null ? plain : withWeldToe(plain, toe as Mm),
    referenceStress: chosen(entry.referenceStress, wish.referenceStress),
  };
}

const chosen = <T extends { readonly key: string }>(
  [first, ...others]: readonly [T, ...T[]],
  key: string | null,
): T => others.find((each) => each.key === key) ?? first;
