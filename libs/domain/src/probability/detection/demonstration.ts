import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { betaBelow, betaQuantile } from '../../numerics/incomplete-beta';

const MOST_TRIALS = 100_000;

/** How many flaws must be tried to demonstrate a probability of detection. */
export interface DemonstrationSize {
  readonly status: 'found';
  readonly trials: number;
  readonly misses: number;
}

/** What a trial demonstrates. */
export interface DemonstratedDetection {
  readonly status: 'found';
  /** Share found. */
  readonly observed: number;
  /** One-sided lower bound at the confidence asked for. */
  readonly lower: number;
  readonly method: 'Clopper and Pearson, one-sided';
}

/**
 * Smallest number of trials that demonstrates a probability of detection with a number of misses allowed:
 * were the true probability just that, so few misses would have a chance of at most 1 − confidence. 29 of
 * 29, 45 of 46 and 59 of 61 demonstrate 90 % at 95 % confidence.
 */
export function trialsToDemonstrate(
  misses: number,
  detection: number,
  confidence: number,
): DemonstrationSize | Refused {
  const refusals = outOfBounds([
    count('misses', 'Misses allowed', misses, 0, 100),
    share('detection', 'Probability of detection', detection),
    share('confidence', 'Confidence', confidence),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const allowed = Math.floor(misses);
  // chance of at most m misses of n: the binomial sum is an incomplete beta function
  const enough = (n: number) =>
    betaBelow(detection, n - allowed, allowed + 1) <= 1 - confidence + 1e-12;
  let trials = allowed + 1;
  while (trials < MOST_TRIALS && !enough(trials)) trials += 1;
  return enough(trials)
    ? { status: 'found', trials, misses: allowed }
    : refused({
        input: 'detection',
        limit: `at most ${MOST_TRIALS} trials`,
        value: detection,
        message: `More than ${MOST_TRIALS} trials would be needed.`,
        instead: 'Ask for a lower probability of detection or confidence.',
      });
}

/** Lower bound of the probability of detection that a number found of a number tried demonstrates. */
export function demonstratedDetection(
  found: number,
  trials: number,
  confidence: number,
): DemonstratedDetection | Refused {
  const refusals = outOfBounds([
    count('trials', 'Flaws tried', trials, 1, MOST_TRIALS),
    count('found', 'Flaws found', found, 0, Number.isFinite(trials) ? trials : MOST_TRIALS),
    share('confidence', 'Confidence', confidence),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const lower = found === 0 ? 0 : betaQuantile(1 - confidence, found, trials - found + 1);
  return {
    status: 'found',
    observed: found / trials,
    lower,
    method: 'Clopper and Pearson, one-sided',
  };
}

const count = (
  input: string,
  name: string,
  value: number,
  min: number,
  max: number,
): NumberRule => ({
  input,
  name,
  unit: '',
  value: Number.isInteger(value) ? value : Number.NaN,
  min,
  max,
  instead: 'Give a whole number.',
});

const share = (input: string, name: string, value: number): NumberRule => ({
  input,
  name,
  unit: '',
  value,
  min: 0,
  max: 1 - 1e-9,
  above: true,
  instead: 'Give it as a share below 1: 90 % is 0.9.',
});
