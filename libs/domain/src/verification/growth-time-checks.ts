import { integralPerCycle, lifeIntegral } from '../growth/closed-form/power-life';
import { corrosionLife } from '../growth/with-time/corrosion-life';
import { yearsToShare } from '../growth/with-time/thinning';
import { stressIntensityAfter } from '../growth/with-time/thinning-crack';
import { rateWithTime } from '../growth/with-time/time-rate';
import { superposed } from '../growth/with-time/time-rates';
import { timeLaw } from '../materials/time-law-library';
import { findRoot } from '../numerics/find-root';
import { toMPaSqrtMm } from '../units/convert';
import { fromMmPerYear } from '../units/time-rate';
import type { CheckRow } from './check-row';
import { growthRow as row } from './growth-row';

const ALLOY_SOURCE = 'EPRI MRP-55 (from memory)';

const alloyRate = (k: number, temperature: number) => {
  const law = timeLaw('alloy-600-primary-water');
  const rate = law && rateWithTime(law, temperature)(toMPaSqrtMm(k, 'MPa·√m'));
  return rate === undefined ? Number.NaN : fromMmPerYear(rate, 'm', 's');
};

const thinning = { rateMmPerYear: 0.1, face: 'opposite' } as const;
const THINNING_CRACK = {
  depthMm: 4,
  wallMm: 20,
  growthMmPerYear: 0.4,
  thinning,
  stressMPa: 120,
  shapeFactor: 1.12,
};

const added = () => {
  const into = { a: 0, c: 0 };
  const part = (a: number) => (_a: number, _c: number, one: typeof into) => {
    one.a = a;
    one.c = 0;
  };
  superposed(part(2000 * 1e-4), part(0.15))(1, 1, into, 0);
  return into.a;
};

export const GROWTH_TIME_CHECKS: readonly CheckRow[] = [
  row(
    'GQ-1',
    'plateau of 0.5 mm/year from 3 to 12 mm',
    18,
    'years',
    1e-9,
    'closed form',
    '(a1 − a0)/v',
    () => lifeIntegral(0, 3, 12) / integralPerCycle({ coefficient: 0.5, exponent: 0 }, 150),
  ),
  row(
    'GQ-2',
    'power law, n = 2, C = 1e-4, 150 MPa: time from 3 to 12 mm',
    0.1961205334690236,
    'time',
    1e-9,
    'closed form',
    'ln(a1/a0)/(C S² π)',
    () => lifeIntegral(2, 3, 12) / integralPerCycle({ coefficient: 1e-4, exponent: 2 }, 150),
  ),
  row(
    'GQ-3',
    'alloy 600 in primary water: rate at 30 MPa·√m, 325 °C',
    9.126108825206181e-11,
    'm/s',
    1e-9,
    'from memory',
    ALLOY_SOURCE,
    () => alloyRate(30, 325),
  ),
  row(
    'GQ-4',
    'the same at 8 MPa·√m, below the threshold',
    0,
    'm/s',
    0,
    'from memory',
    ALLOY_SOURCE,
    () => alloyRate(8, 325),
  ),
  row(
    'GQ-5',
    'crack of 4 mm at 0.4 mm/year, wall of 20 mm thinning 0.1 mm/year: time to a/B = 0.8',
    25,
    'years',
    1e-9,
    'closed form',
    '(q B0 − a0)/(v + q r)',
    () => yearsToShare(4, 20, 0.8, 0.4, thinning),
  ),
  row(
    'GQ-6',
    'the same, 120 MPa rising with B0/(B0 − r t): time to 60 MPa·√m, were the wall deep enough',
    63.68029721443017,
    'years',
    1e-9,
    'independent computation',
    'root of the same equation in another program',
    () =>
      findRoot(
        (years) => stressIntensityAfter(THINNING_CRACK, years) - toMPaSqrtMm(60, 'MPa·√m'),
        0,
        150,
      ).x,
  ),
  row(
    'GQ-7',
    'cycles and time added: 2000 · 10⁻⁴ + 0.15',
    0.35,
    'mm/year',
    1e-9,
    'closed form',
    'Wei and Landes',
    added,
  ),
  row(
    'GQ-8',
    'corrosion life: 18 mm, 12 mm required, 0.4 mm/year',
    15,
    'years',
    1e-9,
    'closed form',
    '(t − t_req)/rate',
    () => {
      const life = corrosionLife(18, 12, 0.4);
      return life.status === 'found' ? life.years : Number.NaN;
    },
  ),
];
