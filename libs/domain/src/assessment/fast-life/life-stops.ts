/**
 * Why a flaw is followed no further: it leaves the range of the solution by its depth (a/t = 0.8), its length
 * (2c/W = 0.5), as too short (a/c = 2) or too long (a/c = 0.04); its Kmax reaches the toughness; nothing grows; the
 * evaluations allowed were not enough; or it was refused. The order is that of the codes in a table of lives, the
 * first four that of the events.
 */
export const LIFE_STOPS = [
  'depth',
  'length',
  'short',
  'long',
  'toughness',
  'no growth',
  'unresolved',
  'refused',
] as const;

export type LifeStop = (typeof LIFE_STOPS)[number];

/** Code of a stop. */
export const stopCode = (stop: LifeStop): number => LIFE_STOPS.indexOf(stop);
