import type { Box } from './place-labels';
import type { Outline } from './section-drawing';

/** How the wall lies in a section view. */
export interface Frame {
  readonly wallMm: number;
  /** Pixels for one millimetre, both ways. */
  readonly scale: number;
  readonly wall: Box;
  /** Middle of the flaw; the edge of the wall where its length is measured from one. */
  readonly middleX: number;
  /** Where the room of the flaw ends and that of the labels begins. */
  readonly edge: number;
}

/** Extent of an outline on the positive side of the frame's middle [mm]. */
export const reachOf = ({ lengthMm, oneSided }: Outline): number =>
  oneSided ? lengthMm : lengthMm / 2;

/** Whether a flaw opens to a face: its height is then counted from there. */
export const opensToFace = ({ kind }: Outline): boolean =>
  kind === 'surface' || kind === 'extended surface' || kind === 'corner';

/** Whether a flaw goes through the wall. */
export const goesThrough = ({ kind }: Outline): boolean =>
  kind === 'through-wall' || kind === 'edge';

/** Where a height above the inside surface stands in the drawing. */
export const yOf = (fromInsideMm: number, { wall, scale }: Frame): number =>
  wall.bottom - fromInsideMm * scale;
