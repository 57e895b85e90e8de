import type { FatigueLaw, Drivers } from '../growth/growth-rates';
import type { Thinning } from '../growth/with-time/thinning';
import { rateWithTime, type RateWithTime } from '../growth/with-time/time-rate';
import { crackLaw } from '../materials/crack-law-library';
import type { TimeLaw } from '../materials/time-law';
import { timeLaw } from '../materials/time-law-library';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import type { AssessmentInput, FatigueLawInput, TimeLawInput } from './assessment-input';

/** Everything that drives the growth; each part may be absent. */
export interface GrowthDrivers extends Drivers {
  /** Growth with time by the stress intensity that stays on. */
  readonly withTime: { readonly law: TimeLaw; readonly rate: RateWithTime } | null;
  readonly thinning: Thinning | null;
}

/** What drives the growth, origins left behind; the input has passed its checks. */
export function driversOf({ growth }: AssessmentInput): GrowthDrivers {
  const { fatigue, stressCorrosion, thinning } = growth;
  return {
    fatigue: fatigue && {
      law: fatigueLawOf(fatigue.law),
      blocks: fatigue.blocks.map(({ stressRatio, ...block }) => ({
        ...block,
        ...(typeof stressRatio === 'number' ? { stressRatio } : {}),
      })),
      conditions: fatigue.temperatureC ? { temperatureC: fatigue.temperatureC.value } : {},
    },
    stressCorrosion: stressCorrosion && {
      depthRateMmPerYear: stressCorrosion.depthRateMmPerYear.value,
      endRateMmPerYear: stressCorrosion.endRateMmPerYear.value,
    },
    withTime: withTimeOf(growth.withTime ?? null),
    thinning: thinning
      ? { rateMmPerYear: thinning.rateMmPerYear.value, face: thinning.face }
      : null,
  };
}

/** The law as the integrator takes it: by stages, or a published one of another form. */
export const fatigueLawOf = (law: FatigueLawInput): FatigueLaw =>
  (law.published ? crackLaw(law.key) : undefined) ?? law;

function withTimeOf(given: AssessmentInput['growth']['withTime']): GrowthDrivers['withTime'] {
  if (!given) return null;
  const law = timeLawOf(given.law);
  return law ? { law, rate: rateWithTime(law, given.temperatureC.value) } : null;
}

const ROOT_METRE = MPA_SQRT_MM_PER['MPa·√m'];

/** The published law of a key, or the plant's own as a law; undefined when the key is not known. */
export function timeLawOf(law: TimeLawInput): TimeLaw | undefined {
  if (law.kind === 'published') return timeLaw(law.key);
  return {
    form: 'power',
    key: 'own',
    title: 'Power law of the plant',
    environment: 'as measured',
    source: law.coefficient.note || 'Input',
    coefficient: law.coefficient.value / ROOT_METRE ** law.exponent.value,
    exponent: law.exponent.value,
    plateauMmPerYear: law.plateauMmPerYear?.value ?? null,
    thresholdMPaSqrtMm: law.thresholdMPaSqrtM.value * ROOT_METRE,
    stressIntensityMPaSqrtMm: [0, Infinity],
    temperatureC: [-273, Infinity],
  };
}
