import {
  CYLINDER_CIRCUMFERENTIAL_OUTSIDE_REFERENCE,
  CYLINDER_CIRCUMFERENTIAL_REFERENCE,
} from './reference-stress/cylinder-circumferential-reference';
import {
  CYLINDER_AXIAL_OUTSIDE_REFERENCE,
  CYLINDER_AXIAL_REFERENCE,
} from './reference-stress/cylinder-axial-reference';
import { PLATE_EMBEDDED_REFERENCE } from './reference-stress/plate-embedded-reference';
import { PLATE_SURFACE_REFERENCE } from './reference-stress/plate-surface-reference';
import type { FlawKind, WallShape } from '../geometry/flaw-kind';
import type { ReferenceStressSolution } from './reference-stress/solution';
import { CYLINDER_EMBEDDED_K } from './stress-intensity/cylinder-embedded-k';
import {
  CYLINDER_AXIAL_INSIDE_K,
  CYLINDER_AXIAL_OUTSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_INSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K,
} from './stress-intensity/cylinder-surface-k';
import { PLATE_EMBEDDED_K } from './stress-intensity/plate-embedded-k';
import { PLATE_SURFACE_K } from './stress-intensity/plate-surface-k';
import type { StressIntensitySolution } from './stress-intensity/solution';

/** What the choice of a solution depends on. */
export interface FlawSituation {
  readonly shape: WallShape;
  readonly kind: FlawKind;
  readonly face: 'inside' | 'outside';
  readonly orientation: 'axial' | 'circumferential';
  readonly flawedSides: 'one' | 'both';
}

/** The two solutions a flaw is assessed with. */
export interface ChosenSolutions {
  readonly stressIntensity: StressIntensitySolution;
  readonly referenceStress: ReferenceStressSolution;
}

const pair = (
  stressIntensity: StressIntensitySolution,
  referenceStress: ReferenceStressSolution,
): ChosenSolutions => ({ stressIntensity, referenceStress });

/** The catalogue by situation: a new solution is one new file and one line here. */
export const CATALOGUE = {
  'plate surface': pair(PLATE_SURFACE_K, PLATE_SURFACE_REFERENCE),
  'plate embedded': pair(PLATE_EMBEDDED_K, PLATE_EMBEDDED_REFERENCE),
  'cylinder embedded': pair(CYLINDER_EMBEDDED_K, PLATE_EMBEDDED_REFERENCE),
  'axial inside': pair(CYLINDER_AXIAL_INSIDE_K, CYLINDER_AXIAL_REFERENCE),
  'axial outside': pair(CYLINDER_AXIAL_OUTSIDE_K, CYLINDER_AXIAL_OUTSIDE_REFERENCE),
  'circumferential inside': pair(
    CYLINDER_CIRCUMFERENTIAL_INSIDE_K,
    CYLINDER_CIRCUMFERENTIAL_REFERENCE,
  ),
  'circumferential outside': pair(
    CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K,
    CYLINDER_CIRCUMFERENTIAL_OUTSIDE_REFERENCE,
  ),
} as const satisfies Readonly<Record<string, ChosenSolutions>>;

const placeOf = ({ shape, kind, face, orientation }: FlawSituation): string =>
  shape === 'cylinder' && kind === 'surface' ? `${orientation} ${face}` : `${shape} ${kind}`;

const BY_PLACE: Readonly<Record<string, ChosenSolutions>> = CATALOGUE;

/** Whether published solutions cover the situation. */
export const isCovered = (situation: FlawSituation): boolean => placeOf(situation) in BY_PLACE;

/** The solutions that govern by default: chosen by the body, the flaw and where it opens. */
export function selectSolutions(situation: FlawSituation): ChosenSolutions {
  const chosen = BY_PLACE[placeOf(situation)];
  if (!chosen) throw new RangeError(`no solution for ${placeOf(situation)}`);
  return chosen;
}
