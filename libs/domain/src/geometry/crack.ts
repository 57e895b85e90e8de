import type { Mm } from '../units/quantity';

/** A crack in its wall, as the published solutions see it. */
export interface Crack {
  /** a: depth of a surface crack, half height of an embedded one [mm]. */
  readonly a: Mm;
  /** c: half length [mm]. */
  readonly c: Mm;
  /** p: ligament from an embedded crack to the face it is measured to; 0 for a surface crack [mm]. */
  readonly ligament: Mm;
  /** t: wall thickness [mm]. */
  readonly thickness: Mm;
  /** W: full width of a plate; Infinity when wide against the crack [mm]. */
  readonly width: Mm;
  /** Ri: inside radius of a cylinder; Infinity for a plate [mm]. */
  readonly insideRadius: Mm;
  /** r: radius of the hole the crack starts from; 0 without a hole [mm]. */
  readonly holeRadius: Mm;
}

/** Distance from the centre of an embedded crack to the nearer face [mm]. */
export const centreToNearerFace = ({ a, ligament, thickness }: Crack) =>
  Math.min(ligament + a, thickness - ligament - a) as Mm;
