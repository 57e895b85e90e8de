import { BAR_PENNY_K } from './bar-penny-k';
import { BAR_RING_K } from './bar-ring-k';
import { HOLE_CORNER_ONE_K, HOLE_CORNER_TWO_K } from './hole-corner-k';
import { HOLE_SURFACE_ONE_K, HOLE_SURFACE_TWO_K } from './hole-surface-k';
import { HOLE_THROUGH_ONE_K, HOLE_THROUGH_TWO_K } from './hole-through-k';
import { NOZZLE_CORNER_K } from './nozzle-corner-k';
import { PLATE_CORNER_K } from './plate-corner-k';
import { PLATE_EDGE_K } from './plate-edge-k';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';
import {
  PLATE_EXTENDED_SURFACE_HELD_K,
  PLATE_EXTENDED_SURFACE_K,
} from './plate-extended-surface-k';
import { PLATE_SURFACE_K } from './plate-surface-k';
import { PLATE_THROUGH_WALL_K } from './plate-through-wall-k';
import type { StressIntensitySolution } from './solution';

/** Every K solution of flat walls, holes, bars and nozzle corners. */
export const FLAT_K_SOLUTIONS: readonly StressIntensitySolution[] = [
  PLATE_THROUGH_WALL_K,
  PLATE_SURFACE_K,
  PLATE_EXTENDED_SURFACE_K,
  PLATE_EXTENDED_SURFACE_HELD_K,
  PLATE_EMBEDDED_K,
  PLATE_CORNER_K,
  PLATE_EDGE_K,
  HOLE_THROUGH_ONE_K,
  HOLE_THROUGH_TWO_K,
  HOLE_CORNER_ONE_K,
  HOLE_CORNER_TWO_K,
  HOLE_SURFACE_ONE_K,
  HOLE_SURFACE_TWO_K,
  NOZZLE_CORNER_K,
  BAR_RING_K,
  BAR_PENNY_K,
];
