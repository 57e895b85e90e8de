import {
  NOZZLE_CORNER_REFERENCE,
  PLATE_CORNER_REFERENCE,
} from './reference-stress/corner-reference';
import { CYLINDER_AXIAL_API_REFERENCE } from './reference-stress/cylinder-axial-api-reference';
import {
  CYLINDER_AXIAL_OUTSIDE_REFERENCE,
  CYLINDER_AXIAL_REFERENCE,
} from './reference-stress/cylinder-axial-reference';
import {
  CYLINDER_CIRCUMFERENTIAL_OUTSIDE_REFERENCE,
  CYLINDER_CIRCUMFERENTIAL_REFERENCE,
} from './reference-stress/cylinder-circumferential-reference';
import {
  CYLINDER_AXIAL_EXTENDED_REFERENCE,
  CYLINDER_FULL_INSIDE_REFERENCE,
  CYLINDER_FULL_OUTSIDE_REFERENCE,
} from './reference-stress/cylinder-extended-reference';
import {
  CYLINDER_AXIAL_THROUGH_WALL_API_REFERENCE,
  CYLINDER_AXIAL_THROUGH_WALL_REFERENCE,
  CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_REFERENCE,
} from './reference-stress/cylinder-through-wall-reference';
import {
  EXTENDED_SURFACE_HELD_REFERENCE,
  EXTENDED_SURFACE_REFERENCE,
  PLATE_EDGE_REFERENCE,
} from './reference-stress/extended-surface-reference';
import {
  HOLE_CORNER_ONE_REFERENCE,
  HOLE_CORNER_TWO_REFERENCE,
  HOLE_THROUGH_ONE_REFERENCE,
  HOLE_THROUGH_TWO_REFERENCE,
} from './reference-stress/hole-reference';
import { PLATE_EMBEDDED_REFERENCE } from './reference-stress/plate-embedded-reference';
import { PLATE_SURFACE_API_REFERENCE } from './reference-stress/plate-surface-api-reference';
import { PLATE_SURFACE_REFERENCE } from './reference-stress/plate-surface-reference';
import { PLATE_THROUGH_WALL_REFERENCE } from './reference-stress/plate-through-wall-reference';
import { BAR_PENNY_REFERENCE, BAR_RING_REFERENCE } from './reference-stress/round-bar-reference';
import type { ReferenceStressSolution } from './reference-stress/solution';
import {
  SPHERE_SURFACE_REFERENCE,
  SPHERE_THROUGH_WALL_REFERENCE,
} from './reference-stress/sphere-reference';
import { BAR_PENNY_K } from './stress-intensity/bar-penny-k';
import { BAR_RING_K } from './stress-intensity/bar-ring-k';
import {
  CYLINDER_AXIAL_THROUGH_WALL_K,
  CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K,
  SPHERE_THROUGH_WALL_K,
} from './stress-intensity/curved-through-wall-k';
import { CYLINDER_EMBEDDED_K } from './stress-intensity/cylinder-embedded-k';
import {
  CYLINDER_AXIAL_EXTENDED_INSIDE_K,
  CYLINDER_AXIAL_EXTENDED_OUTSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_FULL_OUTSIDE_K,
} from './stress-intensity/cylinder-long-k';
import {
  CYLINDER_AXIAL_INSIDE_K,
  CYLINDER_AXIAL_OUTSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_INSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K,
} from './stress-intensity/cylinder-surface-k';
import { HOLE_CORNER_ONE_K, HOLE_CORNER_TWO_K } from './stress-intensity/hole-corner-k';
import { HOLE_THROUGH_ONE_K, HOLE_THROUGH_TWO_K } from './stress-intensity/hole-through-k';
import { NOZZLE_CORNER_K } from './stress-intensity/nozzle-corner-k';
import { PLATE_CORNER_K } from './stress-intensity/plate-corner-k';
import { PLATE_EDGE_K } from './stress-intensity/plate-edge-k';
import { PLATE_EMBEDDED_K } from './stress-intensity/plate-embedded-k';
import {
  PLATE_EXTENDED_SURFACE_HELD_K,
  PLATE_EXTENDED_SURFACE_K,
} from './stress-intensity/plate-extended-surface-k';
import { PLATE_SURFACE_K } from './stress-intensity/plate-surface-k';
import { PLATE_THROUGH_WALL_K } from './stress-intensity/plate-through-wall-k';
import type { StressIntensitySolution } from './stress-intensity/solution';
import { SPHERE_EMBEDDED_K, SPHERE_SURFACE_K } from './stress-intensity/sphere-k';

/** The solutions of one situation: the first of each list governs, the others may be chosen with a reason. */
export interface CatalogueEntry {
  readonly stressIntensity: readonly [StressIntensitySolution, ...StressIntensitySolution[]];
  readonly referenceStress: readonly [ReferenceStressSolution, ...ReferenceStressSolution[]];
}

const entry = (
  stressIntensity: StressIntensitySolution | CatalogueEntry['stressIntensity'],
  referenceStress: ReferenceStressSolution | CatalogueEntry['referenceStress'],
): CatalogueEntry => ({
  stressIntensity: 'key' in stressIntensity ? [stressIntensity] : stressIntensity,
  referenceStress: 'key' in referenceStress ? [referenceStress] : referenceStress,
});

const AXIAL_THROUGH = [
  CYLINDER_AXIAL_THROUGH_WALL_REFERENCE,
  CYLINDER_AXIAL_THROUGH_WALL_API_REFERENCE,
] as const;

/** The catalogue by situation: a new solution is one new file and one line here. */
export const CATALOGUE = {
  'plate surface': entry(PLATE_SURFACE_K, [PLATE_SURFACE_REFERENCE, PLATE_SURFACE_API_REFERENCE]),
  // nothing says that a flat plate is held against bending
  'plate extended surface': entry(
    [PLATE_EXTENDED_SURFACE_K, PLATE_EXTENDED_SURFACE_HELD_K],
    [EXTENDED_SURFACE_REFERENCE, EXTENDED_SURFACE_HELD_REFERENCE],
  ),
  'plate embedded': entry(PLATE_EMBEDDED_K, PLATE_EMBEDDED_REFERENCE),
  'plate through-wall': entry(PLATE_THROUGH_WALL_K, PLATE_THROUGH_WALL_REFERENCE),
  'plate corner': entry(PLATE_CORNER_K, PLATE_CORNER_REFERENCE),
  'plate edge': entry(PLATE_EDGE_K, PLATE_EDGE_REFERENCE),
  'axial inside surface': entry(CYLINDER_AXIAL_INSIDE_K, [
    CYLINDER_AXIAL_REFERENCE,
    CYLINDER_AXIAL_API_REFERENCE,
  ]),
  'axial outside surface': entry(CYLINDER_AXIAL_OUTSIDE_K, CYLINDER_AXIAL_OUTSIDE_REFERENCE),
  'circumferential inside surface': entry(
    CYLINDER_CIRCUMFERENTIAL_INSIDE_K,
    CYLINDER_CIRCUMFERENTIAL_REFERENCE,
  ),
  'circumferential outside surface': entry(
    CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K,
    CYLINDER_CIRCUMFERENTIAL_OUTSIDE_REFERENCE,
  ),
  'axial inside extended surface': entry(
    CYLINDER_AXIAL_EXTENDED_INSIDE_K,
    CYLINDER_AXIAL_EXTENDED_REFERENCE,
  ),
  'axial outside extended surface': entry(
    CYLINDER_AXIAL_EXTENDED_OUTSIDE_K,
    CYLINDER_AXIAL_EXTENDED_REFERENCE,
  ),
  'circumferential inside extended surface': entry(
    CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K,
    CYLINDER_FULL_INSIDE_REFERENCE,
  ),
  'circumferential outside extended surface': entry(
    CYLINDER_CIRCUMFERENTIAL_FULL_OUTSIDE_K,
    CYLINDER_FULL_OUTSIDE_REFERENCE,
  ),
  'cylinder embedded': entry(CYLINDER_EMBEDDED_K, PLATE_EMBEDDED_REFERENCE),
  'axial through-wall': entry(CYLINDER_AXIAL_THROUGH_WALL_K, AXIAL_THROUGH),
  'circumferential through-wall': entry(
    CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K,
    CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_REFERENCE,
  ),
  'sphere surface': entry(SPHERE_SURFACE_K, SPHERE_SURFACE_REFERENCE),
  'sphere embedded': entry(SPHERE_EMBEDDED_K, PLATE_EMBEDDED_REFERENCE),
  'sphere through-wall': entry(SPHERE_THROUGH_WALL_K, SPHERE_THROUGH_WALL_REFERENCE),
  'hole edge through-wall one': entry(HOLE_THROUGH_ONE_K, HOLE_THROUGH_ONE_REFERENCE),
  'hole edge through-wall both': entry(HOLE_THROUGH_TWO_K, HOLE_THROUGH_TWO_REFERENCE),
  'hole edge corner one': entry(HOLE_CORNER_ONE_K, HOLE_CORNER_ONE_REFERENCE),
  'hole edge corner both': entry(HOLE_CORNER_TWO_K, HOLE_CORNER_TWO_REFERENCE),
  'nozzle corner corner': entry(NOZZLE_CORNER_K, NOZZLE_CORNER_REFERENCE),
  'round bar extended surface': entry(BAR_RING_K, BAR_RING_REFERENCE),
  'round bar embedded': entry(BAR_PENNY_K, BAR_PENNY_REFERENCE),
} as const satisfies Readonly<Record<string, CatalogueEntry>>;

export type CatalogueKey = keyof typeof CATALOGUE;
