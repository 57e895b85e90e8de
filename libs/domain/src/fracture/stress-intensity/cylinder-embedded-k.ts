import { PLATE_EMBEDDED_K } from './plate-embedded-k';
import type { StressIntensitySolution } from './solution';

/** Embedded flaws feel the curvature of the wall least: the plate form is used as it is. */
export const CYLINDER_EMBEDDED_K: StressIntensitySolution = {
  ...PLATE_EMBEDDED_K,
  key: 'cylinder-embedded',
  title: 'Embedded elliptical flaw in a cylinder wall, as in a plate',
  accuracy: `${PLATE_EMBEDDED_K.accuracy} Curvature is left out: common practice for Ri/t ≥ 5.`,
  limits: [
    ...PLATE_EMBEDDED_K.limits,
    {
      name: 'Ri/t',
      text: 'Ri/t ≥ 5',
      min: 5,
      max: Infinity,
      measure: ({ insideRadius, thickness }) => insideRadius / thickness,
      source: 'common practice',
      input: 'wall.insideDiameterMm',
      instead: 'Ask a specialist for a thick-wall solution.',
    },
  ],
};
