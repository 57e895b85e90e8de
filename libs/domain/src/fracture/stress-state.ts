/** Stress in the plane at a point [MPa]; mutable so that maps allocate nothing per point. */
export interface PlaneStress {
  xx: number;
  yy: number;
  xy: number;
}

/** Writes the stress at (x, y) [mm] into `into` and hands it back. */
export type StressField = (x: number, y: number, into: PlaneStress) => PlaneStress;

/** How the thickness holds the material: thin and free, or thick and held. */
export type PlaneCondition = 'plane stress' | 'plane strain';

/** A state without stress, to be written into. */
export const noStress = (): PlaneStress => ({ xx: 0, yy: 0, xy: 0 });
