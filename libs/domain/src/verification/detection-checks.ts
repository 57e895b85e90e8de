import { trialsToDemonstrate } from '../probability/detection/demonstration';
import {
  detectedAtLeastOnce,
  detectionProbability,
  sizeDetectedWith,
} from '../probability/detection/detection-curve';
import { fitDetection, type FittedDetection } from '../probability/detection/fit-detection';
import { growthBetween, type MeasuredGrowth } from '../probability/measured-growth/growth-between';
import { updateDetection } from '../probability/update/update-detection';
import { updateMissedSize } from '../probability/update/update-missed';
import { updateNormal } from '../probability/update/update-normal';
import type { CheckRow } from './check-row';
import { HIT_MISS_SET } from './data/hit-miss-set';
import { CLOSED, probabilityRow as row } from './probability-row';

const CURVE = { form: 'log-logistic', a50Mm: 3, spread: 0.5 } as const;
const FITTED = ['independent computation', 'separate program: maximum likelihood'] as const;
const BINOMIAL = ['closed form', 'binomial sum; the three pairs are common practice'] as const;

function fitted(take: (fit: FittedDetection) => number | null): number {
  const fit = fitDetection(HIT_MISS_SET, 'log-logistic');
  return fit.status === 'fitted' ? (take(fit) ?? Number.NaN) : Number.NaN;
}

function growth(take: (growth: MeasuredGrowth) => number): number {
  const answer = growthBetween(
    { years: 0, sizeMm: 4, sizingSdMm: 0.5 },
    { years: 3, sizeMm: 5.2, sizingSdMm: 0.5 },
  );
  return answer.status === 'measured' ? take(answer) : Number.NaN;
}

const updated = (mean: number, sd: number, measured: number, error: number) => {
  const answer = updateNormal({ mean, sd }, { mean: measured, sd: error });
  return answer.status === 'updated' ? answer : { mean: Number.NaN, sd: Number.NaN };
};

function missed(take: 'meanSizeMm' | 'notFound'): number {
  const answer = updateMissedSize(2, 3);
  return answer.status === 'updated' ? answer[take] : Number.NaN;
}

function demonstration(misses: number): number {
  const answer = trialsToDemonstrate(misses, 0.9, 0.95);
  return answer.status === 'found' ? answer.trials : Number.NaN;
}

export const DETECTION_CHECKS: readonly CheckRow[] = [
  row('PD-1.1', 'probability of detection at a50', 0.5, '', 1e-9, CLOSED, () =>
    detectionProbability(CURVE, 3),
  ),
  row('PD-1.2', 'a90 of a log-logistic curve', 5.497585458364537, 'mm', 1e-9, CLOSED, () =>
    sizeDetectedWith(CURVE, 0.9),
  ),
  row(
    'PD-1.3',
    'found at least once in three inspections',
    0.9999910346033477,
    '',
    1e-9,
    CLOSED,
    () =>
      detectedAtLeastOnce(
        [2.75234813, 6.439103008, 29.0924996].map((size) => detectionProbability(CURVE, size)),
      ),
  ),
  ...([29, 46, 61] as const).map((trials, misses) =>
    row(
      `PD-2.${misses + 1}`,
      `flaws that demonstrate 90/95 with ${misses} missed`,
      trials,
      '',
      0,
      BINOMIAL,
      () => demonstration(misses),
    ),
  ),
  row('PD-3.1', 'hit/miss fit of 40 flaws: b0', -1.943164948771302, '', 1e-5, FITTED, () =>
    fitted(({ b0 }) => b0),
  ),
  row('PD-3.2', 'b1', 2.775993874651376, '', 1e-5, FITTED, () => fitted(({ b1 }) => b1)),
  row('PD-3.3', 'a50', 2.013730391244266, 'mm', 1e-5, FITTED, () => fitted(({ a50Mm }) => a50Mm)),
  row('PD-3.4', 'a90', 4.443747611658736, 'mm', 1e-5, FITTED, () => fitted(({ a90Mm }) => a90Mm)),
  row('PD-3.5', 'a90/95 by the delta method on ln a', 6.799688374545843, 'mm', 1e-5, FITTED, () =>
    fitted(({ a9095 }) => a9095.waldMm),
  ),
  row('PD-3.6', 'a90/95 by the likelihood ratio', 8.0828, 'mm', 1e-5, FITTED, () =>
    fitted(({ a9095 }) => a9095.likelihoodRatioMm),
  ),
  row(
    'PD-4.1',
    'size 4 ± 1 after measuring 5 ± 0.5: mean',
    4.8,
    'mm',
    1e-9,
    CLOSED,
    () => updated(4, 1, 5, 0.5).mean,
  ),
  row(
    'PD-4.2',
    'standard deviation',
    0.4472135954999579,
    'mm',
    1e-9,
    CLOSED,
    () => updated(4, 1, 5, 0.5).sd,
  ),
  row('PD-4.3', 'growth between two findings', 0.4, 'mm/year', 1e-9, CLOSED, () =>
    growth(({ rateMmPerYear }) => rateMmPerYear),
  ),
  row('PD-4.4', 'its standard deviation', 0.2357022603955159, 'mm/year', 1e-9, CLOSED, () =>
    growth(({ rateSdMmPerYear }) => rateSdMmPerYear),
  ),
  row(
    'PD-4.5',
    'rate 0.25 ± 0.15 after that measurement',
    0.293238434163701,
    'mm/year',
    1e-7,
    CLOSED,
    () => updated(0.25, 0.15, 0.4, 0.23570226).mean,
  ),
  row('PD-4.6', 'mean size of a flaw not found', 1.2, 'mm', 1e-9, CLOSED, () =>
    missed('meanSizeMm'),
  ),
  row('PD-4.7', 'probability of not finding it', 0.6, '', 1e-9, CLOSED, () => missed('notFound')),
  row(
    'PD-4.8',
    'mean POD after 18 of 20 from Beta(1, 1)',
    0.8636363636363636,
    '',
    1e-9,
    CLOSED,
    () => {
      const answer = updateDetection({ alpha: 1, beta: 1 }, 18, 20);
      return answer.status === 'updated' ? answer.mean : Number.NaN;
    },
  ),
];
