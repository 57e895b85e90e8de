/** The rule by which an embedded flaw is taken as surface-breaking. */
export const PROXIMITY_RULE =
  'ASME XI IWA-3300 form (from memory): ligament below 0.4 of the half height; the flaw becomes a surface flaw of depth 2a + p, length unchanged';

const SHARE = 0.4;

/** Ligament left above what the rule demands [mm]; an embedded flaw stays embedded while it is above 0. */
export const proximityMargin = (a: number, nearerLigament: number): number =>
  nearerLigament - SHARE * a;

/** Whether an embedded flaw of half height a counts as surface-breaking. */
export const becomesSurface = (a: number, nearerLigament: number): boolean =>
  !(proximityMargin(a, nearerLigament) > 0);

/** Depth of the surface flaw it becomes: its height and the ligament together [mm]. */
export const surfaceDepth = (a: number, nearerLigament: number): number => 2 * a + nearerLigament;

/** The rule by which a surface flaw is taken as through the wall. */
export const THROUGH_WALL_RULE =
  'API 579-1 Part 9 form (from memory): a/t beyond the range of the solution, 0.8; half length c + (t − a)';

/** Half length of the through-wall flaw that a deep surface flaw becomes [mm]. */
export const throughWallHalfLength = (a: number, c: number, thickness: number): number =>
  c + Math.max(thickness - a, 0);
