import type { Drivers } from '../growth/growth-rates';
import type { AssessmentInput } from './assessment-input';

/** What drives the growth, origins left behind. */
export function driversOf({ growth }: AssessmentInput): Drivers {
  const { fatigue, stressCorrosion } = growth;
  return {
    fatigue,
    stressCorrosion: stressCorrosion && {
      depthRateMmPerYear: stressCorrosion.depthRateMmPerYear.value,
      endRateMmPerYear: stressCorrosion.endRateMmPerYear.value,
    },
  };
}
