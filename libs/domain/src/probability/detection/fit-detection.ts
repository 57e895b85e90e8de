import { outOfBounds, refused, type Refusal, type Refused } from '../../geometry/refusal';
import type { DetectionCurve, DetectionForm } from './detection-curve';
import { LINKS } from './links';
import { maximiseLikelihood, type HitOrMiss } from './maximise-likelihood';
import { likelihoodRatioBound, waldBound } from './upper-bounds';

/** A probability of detection fitted to flaws found and missed. */
export interface FittedDetection {
  readonly status: 'fitted';
  readonly curve: DetectionCurve;
  /** Line over ln a: logit or probit of the probability is b0 + b1 ln a. */
  readonly b0: number;
  readonly b1: number;
  readonly a50Mm: number;
  readonly a90Mm: number;
  /** Size found with probability 0.9, 95 % confidence, by two methods; the likelihood ratio is the safer one. */
  readonly a9095: {
    readonly waldMm: number;
    /** Null when the data put no upper bound on it. */
    readonly likelihoodRatioMm: number | null;
  };
  readonly logLikelihood: number;
  readonly found: number;
  readonly missed: number;
  readonly cautions: readonly string[];
}

const P90 = 0.9;
const FEW = 60;

/** Maximum likelihood fit of flaws of known size that were found or missed. */
export function fitDetection(
  trials: readonly HitOrMiss[],
  form: DetectionForm,
): FittedDetection | Refused {
  const refusals = [...refusalsOfSizes(trials), ...refusalsOfMix(trials)];
  if (refusals.length > 0) return refused(...refusals);
  const link = LINKS[form];
  const fit = maximiseLikelihood(trials, link);
  if (!fit.converged || !(fit.b1 > 0)) return refused(noTrend(fit.b1));
  const eta = link.inverse(P90);
  const a50Mm = Math.exp(-fit.b0 / fit.b1);
  const a90Mm = Math.exp((eta - fit.b0) / fit.b1);
  const found = trials.filter((trial) => trial.found).length;
  const likelihoodRatioMm = likelihoodRatioBound(trials, link, fit, a90Mm, eta);
  return {
    status: 'fitted',
    curve: { form, a50Mm, spread: link.spread(fit.b1) },
    b0: fit.b0,
    b1: fit.b1,
    a50Mm,
    a90Mm,
    a9095: { waldMm: waldBound(fit, a90Mm, eta, fit.b0), likelihoodRatioMm },
    logLikelihood: fit.logLikelihood,
    found,
    missed: trials.length - found,
    cautions: cautionsOf(trials, a90Mm, likelihoodRatioMm),
  };
}

function cautionsOf(
  trials: readonly HitOrMiss[],
  a90: number,
  bound: number | null,
): readonly string[] {
  const largest = Math.max(...trials.map(({ sizeMm }) => sizeMm));
  return [
    ...(trials.length < FEW
      ? [`Only ${trials.length} flaws were tried; ${FEW} or more are common practice.`]
      : []),
    ...(a90 > largest ? ['a90 lies beyond the largest flaw tried: it is extrapolated.'] : []),
    ...(bound === null ? ['The data put no upper bound on a90 at 95 % confidence.'] : []),
  ];
}

const refusalsOfSizes = (trials: readonly HitOrMiss[]): readonly Refusal[] =>
  outOfBounds(
    trials.map(({ sizeMm }, i) => ({
      input: `trials.${i}.sizeMm`,
      name: 'Flaw size',
      unit: 'mm',
      value: sizeMm,
      min: 0,
      max: 1000,
      above: true,
      instead: 'Give it in millimetres.',
    })),
  );

function refusalsOfMix(trials: readonly HitOrMiss[]): readonly Refusal[] {
  const sizes = (wanted: boolean) =>
    trials.filter(({ found }) => found === wanted).map(({ sizeMm }) => sizeMm);
  const [found, missed] = [sizes(true), sizes(false)];
  if (found.length === 0 || missed.length === 0) {
    return [mixRefusal('both found and missed flaws', 'All flaws were found, or all were missed.')];
  }
  // then any steep curve between the two fits equally well
  if (Math.max(...missed) < Math.min(...found)) {
    return [mixRefusal('sizes that overlap', 'Every flaw found is larger than every flaw missed.')];
  }
  return [];
}

const mixRefusal = (limit: string, message: string): Refusal => ({
  input: 'trials',
  limit,
  value: null,
  message: `${message} No curve can be fitted.`,
  instead: 'Use the binomial demonstration, or try more flaws of the sizes in between.',
});

const noTrend = (slope: number): Refusal => ({
  input: 'trials',
  limit: 'detection that rises with size',
  value: Number.isFinite(slope) ? slope : null,
  message: 'Larger flaws were not found more often: size does not explain detection here.',
  instead: 'Use the binomial demonstration, or look for what else decides detection.',
});
