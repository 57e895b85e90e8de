/** Rows over φ = 10, 30, 60, 90°, at a/t = 0.2 and at a/t = 0.8. */
export type CurvatureRows = readonly [shallow: readonly number[], deep: readonly number[]];

/** Change of one influence coefficient against the plate, for a long (a/c = 0.2) and a semicircular flaw. */
export interface CurvatureShare {
  readonly long: CurvatureRows;
  readonly round: CurvatureRows;
}

/** What curvature does to uniform (G0) and linear (G1) stress on the crack, at Ri/t = 10. */
export interface CurvatureTable {
  readonly uniform: CurvatureShare;
  readonly linear: CurvatureShare;
}

/** Angles of the rows [°]. */
export const CURVATURE_ANGLES = [10, 30, 60, 90] as const;
/** Ri/t of the rows, as t/Ri. */
export const CURVATURE_AT = 0.1;

export const CURVATURE_SOURCE =
  'own finite elements at Ri/t = 10 (spectral elements, energy release rate; about 1 %, 2 % at a/t = 0.8), as ratios to the plate';

const NOT_COMPUTED: CurvatureRows = [
  [0, 0, 0, 0],
  [0, 0, 0, 0],
];

// cylinder over plate minus one, row by row from the finite-element results
export const AXIAL_INSIDE: CurvatureTable = {
  uniform: {
    long: [
      [-0.007, -0.0101, -0.0143, -0.016],
      [-0.0068, -0.0022, 0.0226, 0.0632],
    ],
    round: [
      [-0.0118, -0.0104, -0.0091, -0.0087],
      [-0.0397, -0.0278, -0.0079, 0.0023],
    ],
  },
  linear: {
    long: [
      [-0.0092, -0.0083, -0.0094, -0.0099],
      [0.0037, 0.0059, 0.0247, 0.0494],
    ],
    round: [
      [-0.0158, -0.0086, -0.005, -0.0042],
      [-0.0437, -0.0185, -0.0012, 0.005],
    ],
  },
};

export const AXIAL_OUTSIDE: CurvatureTable = {
  uniform: {
    long: [
      [0.0034, 0.0065, 0.0116, 0.0137],
      [0.0739, 0.1484, 0.2716, 0.3246],
    ],
    round: [
      [0.0042, 0.0034, 0.0026, 0.0024],
      [0.0456, 0.0431, 0.0366, 0.0325],
    ],
  },
  linear: {
    long: [
      [0.0026, 0.0049, 0.0076, 0.0086],
      [0.0983, 0.1477, 0.205, 0.2134],
    ],
    round: [
      [0.0045, 0.0025, 0.0014, 0.0011],
      [0.0607, 0.0355, 0.0179, 0.0122],
    ],
  },
};

// round flaws were not computed: no reduction is claimed for them
export const CIRCUMFERENTIAL_INSIDE: CurvatureTable = {
  uniform: {
    long: [
      [-0.0149, -0.0164, -0.0172, -0.0172],
      [-0.224, -0.1924, -0.133, -0.087],
    ],
    round: NOT_COMPUTED,
  },
  linear: {
    long: [
      [-0.0249, -0.0152, -0.0109, -0.0099],
      [-0.278, -0.1755, -0.086, -0.0466],
    ],
    round: NOT_COMPUTED,
  },
};
