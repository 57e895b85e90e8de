import { lognormal } from '../probability/distributions/lognormal';
import { covOfLogSd, logSdBetweenCurves } from '../probability/distributions/lognormal-scatter';
import { normal } from '../probability/distributions/normal';
import { weibull } from '../probability/distributions/weibull';
import { firstOrderReliability } from '../probability/form/first-order-reliability';
import { integrateConditional } from '../probability/integrate-conditional';
import { lifeFractile } from '../probability/life-scatter';
import {
  failureProbabilityOf,
  lognormalIndex,
  normalIndex,
  reliabilityIndex,
} from '../probability/reliability-index';
import {
  conditionalFailureProbability,
  failureProbability,
  type ConditionalFailure,
  type LimitState,
  type PlanOptions,
} from '../probability/sampling/failure-probability';
import {
  FAILURE_CONSEQUENCES,
  SAFETY_COSTS,
  TARGET_RELIABILITY,
  TARGET_RELIABILITY_SOURCE,
} from '../probability/target-reliability';
import { TYPICAL_SCATTER } from '../probability/typical-scatter';
import type { CheckRow } from './check-row';
import { diagramCase, edgeCrackCase, type ToughnessCase } from './data/limit-states';
import { CLOSED, probabilityRow as row } from './probability-row';

const JCSS_INDEX = ['published table', 'JCSS Probabilistic Model Code Part 1, Annex C'] as const;
const JCSS_TARGET = ['published table', TARGET_RELIABILITY_SOURCE] as const;
const COMPUTED = ['independent computation', 'separate program: Gauss–Hermite quadrature'] as const;
const SEARCHED = ['independent computation', 'separate program: design point search'] as const;
const BETWEEN_CURVES = [
  'independent computation',
  'from the constants of the mean and mean + 2 SD curves of BS 7910 (from memory)',
] as const;

const INDEX_CHECKS: readonly CheckRow[] = [
  ...([1.3, 2.3, 3.1, 3.7, 4.2, 4.7, 5.2] as const).map((beta, i) =>
    row(
      `PR-1.${i + 1}`,
      `β at Pf = 1e-${i + 1}, printed to one decimal`,
      beta,
      '',
      0.016,
      JCSS_INDEX,
      () => reliabilityIndex(10 ** -(i + 1)),
    ),
  ),
  row('PR-2.1', 'Pf at β = 2.7735', 0.00277283365762203, '', 1e-9, CLOSED, () =>
    failureProbabilityOf(2.77350098113),
  ),
  row('PR-2.2', 'β of normal R 100 ± 15 against S 50 ± 10', 2.77350098113, '', 1e-9, CLOSED, () =>
    normalIndex({ mean: 100, sd: 15 }, { mean: 50, sd: 10 }),
  ),
  row('PR-2.3', 'β of lognormal R against S', 2.139727575739098, '', 1e-9, CLOSED, () =>
    lognormalIndex({ mean: 120, cov: 0.2 }, { mean: 70, cov: 0.15 }),
  ),
  row('PR-2.4', 'the same by first-order reliability', 2.1397275757391, '', 1e-6, CLOSED, () =>
    index({
      variables: [
        { name: 'R', distribution: lognormal(120, 0.2) },
        { name: 'S', distribution: lognormal(70, 0.15) },
      ],
      margin: (x) => (x[0] as number) - (x[1] as number),
    }),
  ),
  row(
    'PR-2.5',
    '5 % fractile of a lognormal yield of mean 350, CoV 0.07',
    311.2168875160666,
    'MPa',
    1e-9,
    CLOSED,
    () => lognormal(350, 0.07).quantile(0.05),
  ),
];

const TARGETS = [3.1, 3.3, 3.7, 3.7, 4.2, 4.4, 4.2, 4.4, 4.7] as const;
const TARGET_CHECKS: readonly CheckRow[] = SAFETY_COSTS.flatMap((cost, i) =>
  FAILURE_CONSEQUENCES.map((consequence, j) =>
    row(
      `PR-3.${3 * i + j + 1}`,
      `target β, ${cost} cost of safety, ${consequence} consequence`,
      TARGETS[3 * i + j] as number,
      '',
      0,
      JCSS_TARGET,
      () => TARGET_RELIABILITY[cost][consequence],
    ),
  ),
);

const SCATTER = [
  ['yield', 0.07],
  ['paris-air-low', 1.7],
  ['paris-air-high', 0.6],
  ['paris-marine-low', 1.1],
  ['paris-marine-high', 0.16],
  ['initial-depth', 0.66],
  ['initial-aspect', 0.4],
  ['miner-sum', 0.3],
  ['residual-stress', 0.2],
  ['stress-intensity-by-hand', 0.2],
  ['stress-intensity-by-elements', 0.07],
  ['threshold', 0.4],
] as const;
const SCATTER_CHECKS: readonly CheckRow[] = [
  ...SCATTER.map(([key, cov], i) =>
    row(
      `PR-4.${i + 1}`,
      `coefficient of variation: ${key}`,
      cov,
      '',
      0,
      ['published table', 'JCSS Probabilistic Model Code Parts 3.2 and 3.12'],
      () => TYPICAL_SCATTER.find((each) => each.key === key)?.cov ?? Number.NaN,
    ),
  ),
  row(
    'PR-5.1',
    'sd of ln A between the curves, air R ≥ 0.5, upper stage',
    0.3945388538893525,
    '',
    1e-9,
    BETWEEN_CURVES,
    () => logSdBetweenCurves(5.86e-13, 1.29e-12),
  ),
  row(
    'PR-5.2',
    'coefficient of variation it means',
    0.4104021561390278,
    '',
    1e-9,
    BETWEEN_CURVES,
    () => covOfLogSd(logSdBetweenCurves(5.86e-13, 1.29e-12)),
  ),
  row(
    'PR-5.3',
    'coefficient of variation of the lower stage',
    0.851,
    '',
    1e-3,
    BETWEEN_CURVES,
    () => covOfLogSd(logSdBetweenCurves(4.8e-18, 2.1e-17)),
  ),
  row(
    'PR-5.4',
    '5 % fractile of a life of 20 years, sd ln C 0.3945',
    10.45246167569734,
    'years',
    1e-9,
    CLOSED,
    () => lifeFractile(0.05, 20, 0.3945),
  ),
];

const rare = edgeCrackCase(160, [150, 15], [5, 0.2]);
const frequent = edgeCrackCase(100, [250, 25], [8, 0.25]);
const rareDiagram = diagramCase(200, 150, 15);
const frequentDiagram = diagramCase(100, 200, 20);
const shelf = weibull({ minimum: 20, characteristic: 120, shape: 4 });

function index(state: LimitState): number {
  const answer = firstOrderReliability(state);
  return answer.status === 'converged' ? answer.beta : Number.NaN;
}

function exact(state: ConditionalFailure): number {
  const answer = integrateConditional(state);
  return answer.status === 'integrated' ? answer.probability : Number.NaN;
}

function sampled(state: LimitState, options: PlanOptions): number {
  const answer = failureProbability(state, options);
  return answer.status === 'estimated' ? answer.probability : Number.NaN;
}

/** Sampling around the design point, evenly spread. */
function around({ whole }: ToughnessCase, samples: number): number {
  const answer = firstOrderReliability(whole);
  if (answer.status !== 'converged') return Number.NaN;
  return sampled(whole, { samples, seed: 1, points: 'sobol', centre: answer.designPoint });
}

/** The same with the toughness, the last variable, integrated out. */
function aroundGivenToughness({ whole, conditional }: ToughnessCase, samples: number): number {
  const point = firstOrderReliability(whole);
  if (point.status !== 'converged') return Number.NaN;
  const centre = point.designPoint.slice(0, -1);
  const answer = conditionalFailureProbability(conditional, { samples, seed: 1, centre });
  return answer.status === 'estimated' ? answer.probability : Number.NaN;
}

// four standard errors of so many independent samples, relative
const fourErrors = (probability: number, samples: number) =>
  4 * Math.sqrt((1 - probability) / (probability * samples));
const CRUDE = 40_000;

const LIMIT_STATE_CHECKS: readonly CheckRow[] = [
  row(
    'PR-6.1',
    'P(Kmat < 60) of a Weibull toughness, K0 120',
    0.02527509839820608,
    '',
    1e-9,
    CLOSED,
    () => shelf.below(60),
  ),
  row('PR-6.2', 'P(K > Kmat), K normal 60 ± 8', 0.03107243056840744, '', 1e-8, COMPUTED, () =>
    exact({
      variables: [{ name: 'K', distribution: normal(60, 8) }],
      probability: (x) => shelf.below(x[0] as number),
    }),
  ),
  row('PR-7.1', 'edge crack, rare: Pf integrated', 7.500606221396588e-7, '', 1e-6, COMPUTED, () =>
    exact(rare.conditional),
  ),
  row('PR-7.2', 'edge crack, rare: β of first order', 4.760650593714876, '', 1e-6, SEARCHED, () =>
    index(rare.whole),
  ),
  row(
    'PR-7.3',
    'edge crack, rare: first order over exact Pf',
    1.286361900065542,
    '',
    1e-5,
    SEARCHED,
    () => failureProbabilityOf(index(rare.whole)) / exact(rare.conditional),
  ),
  row(
    'PR-7.4',
    'edge crack, rare: Pf by 4096 points around the design point',
    7.500606221396588e-7,
    '',
    0.05,
    COMPUTED,
    () => around(rare, 4096),
  ),
  row(
    'PR-7.5',
    'edge crack, rare: Pf by 1024 points around the design point, given the toughness',
    7.500606221396588e-7,
    '',
    0.03,
    COMPUTED,
    () => aroundGivenToughness(rare, 1024),
  ),
  row(
    'PR-8.1',
    'edge crack, frequent: Pf integrated',
    0.01266518392545565,
    '',
    1e-6,
    COMPUTED,
    () => exact(frequent.conditional),
  ),
  row(
    'PR-8.2',
    'edge crack, frequent: β of first order',
    2.232453634340345,
    '',
    1e-6,
    SEARCHED,
    () => index(frequent.whole),
  ),
  row(
    'PR-8.3',
    'edge crack, frequent: Pf by 40 000 random points, within four standard errors',
    0.01266518392545565,
    '',
    fourErrors(0.01266518392545565, CRUDE),
    COMPUTED,
    () => sampled(frequent.whole, { samples: CRUDE, seed: 1 }),
  ),
  row(
    'PR-8.4',
    'edge crack, frequent: Pf by 4096 points around the design point',
    0.01266518392545565,
    '',
    0.05,
    COMPUTED,
    () => around(frequent, 4096),
  ),
  row('PR-9.1', 'diagram, rare: Pf integrated', 1.462450818317785e-5, '', 1e-3, COMPUTED, () =>
    exact(rareDiagram.conditional),
  ),
  row('PR-9.2', 'diagram, rare: β of that Pf', 4.179235902570307, '', 1e-4, COMPUTED, () =>
    reliabilityIndex(exact(rareDiagram.conditional)),
  ),
  row('PR-9.3', 'diagram, rare: β of first order', 4.154111919927757, '', 1e-5, SEARCHED, () =>
    index(rareDiagram.whole),
  ),
  row('PR-9.4', 'diagram, frequent: Pf integrated', 0.008893941993204537, '', 1e-3, COMPUTED, () =>
    exact(frequentDiagram.conditional),
  ),
  row(
    'PR-9.5',
    'diagram, frequent: Pf by 1024 points around the design point, given the toughness',
    0.008893941993204537,
    '',
    5e-3,
    COMPUTED,
    () => aroundGivenToughness(frequentDiagram, 1024),
  ),
  row(
    'PR-9.6',
    'diagram, frequent: Pf by 40 000 random points, within four standard errors',
    0.008893941993204537,
    '',
    fourErrors(0.008893941993204537, CRUDE),
    COMPUTED,
    () => sampled(frequentDiagram.whole, { samples: CRUDE, seed: 1 }),
  ),
];

export const RELIABILITY_CHECKS: readonly CheckRow[] = [
  ...INDEX_CHECKS,
  ...TARGET_CHECKS,
  ...SCATTER_CHECKS,
  ...LIMIT_STATE_CHECKS,
];
