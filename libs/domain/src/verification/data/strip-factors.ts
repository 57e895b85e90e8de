/** Hole in a strip: d/W and gross peak factor. Howland 1930, table (from memory). */
export const HOWLAND = [
  [0, 3],
  [0.1, 3.03],
  [0.2, 3.14],
  [0.3, 3.36],
  [0.4, 3.74],
  [0.5, 4.32],
] as const;

/** The same by own boundary collocation: d/W and gross peak factor. */
export const COLLOCATED_HOLES = [
  [0.1, 3.0361],
  [0.2, 3.1526],
  [0.3, 3.3744],
  [0.4, 3.7472],
  [0.5, 4.3477],
  [0.6, 5.3186],
] as const;

/** Ellipse in a strip by own boundary collocation: A/B, 2A/W and net peak factor. */
export const COLLOCATED_ELLIPSES = [
  [0.5, 0.2, 1.7403],
  [0.5, 0.4, 1.7105],
  [0.5, 0.6, 1.7715],
  [2, 0.2, 4.1431],
  [2, 0.4, 3.5027],
  [2, 0.6, 3.0139],
  [4, 0.2, 7.4129],
  [4, 0.4, 6.1273],
  [4, 0.6, 5.006],
] as const;
