import type { Box } from './place-labels';

/** How the wall lies in a section view. */
export interface Frame {
  readonly wallMm: number;
  /** Pixels for one millimetre, both ways. */
  readonly scale: number;
  readonly wall: Box;
  readonly middleX: number;
  /** Where the room of the flaw ends and that of the labels begins. */
  readonly edge: number;
}

/** Where a height above the inside surface stands in the drawing. */
export const yOf = (fromInsideMm: number, { wall, scale }: Frame): number =>
  wall.bottom - fromInsideMm * scale;
