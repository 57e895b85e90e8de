import { PLATE_EMBEDDED_REFERENCE } from './reference-stress/plate-embedded-reference';
import { PLATE_SURFACE_REFERENCE } from './reference-stress/plate-surface-reference';
import type { ReferenceStressSolution } from './reference-stress/solution';
import { PLATE_EMBEDDED_K } from './stress-intensity/plate-embedded-k';
import { PLATE_SURFACE_K } from './stress-intensity/plate-surface-k';
import type { StressIntensitySolution } from './stress-intensity/solution';

/** What the choice of a solution depends on. */
export interface FlawSituation {
  readonly shape: 'plate' | 'cylinder';
  readonly kind: 'surface' | 'embedded';
  readonly face: 'inside' | 'outside';
  readonly orientation: 'axial' | 'circumferential';
}

/** The two solutions a flaw is assessed with. */
export interface ChosenSolutions {
  readonly stressIntensity: StressIntensitySolution;
  readonly referenceStress: ReferenceStressSolution;
}

/** Chooses the published solutions by geometry and flaw: one place, so that a new solution is one more line. */
export function selectSolutions({ kind }: FlawSituation): ChosenSolutions {
  return kind === 'surface'
    ? { stressIntensity: PLATE_SURFACE_K, referenceStress: PLATE_SURFACE_REFERENCE }
    : { stressIntensity: PLATE_EMBEDDED_K, referenceStress: PLATE_EMBEDDED_REFERENCE };
}
