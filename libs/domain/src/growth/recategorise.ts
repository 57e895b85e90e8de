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
