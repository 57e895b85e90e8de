import { monthsAfter } from '../scheduling/calendar-date';
import { wholeMonths, type IntervalOutcome } from '../scheduling/interval-outcome';
import {
  factoredLifeInterval,
  growthWindowInterval,
  pipingThicknessInterval,
  pipingVisualInterval,
  vesselInternalInterval,
} from '../scheduling/interval-rules';
import { corrosionRates, thinningLife, type CorrosionRates } from '../scheduling/thinning-life';
import type { CheckRow } from './check-row';

const API_510 = ['from memory', 'API 510, 6.5.1 (from memory)'] as const;
const API_570 = ['published table', 'API 570, Table 2, as quoted by a county regulator'] as const;
const GUIDE = [
  'published table',
  'answer key of a study guide for pressure equipment inspectors',
] as const;
const CLOSED = ['closed form', 'closed form'] as const;
const PRACTICE = ['closed form', 'common practice: life over a factor'] as const;

const row = (
  id: string,
  quantity: string,
  published: number,
  unit: string,
  tolerance: number,
  [kind, source]: readonly [CheckRow['kind'], string],
  compute: () => number,
): CheckRow => ({
  id,
  group: 'Intervals',
  quantity,
  published,
  unit,
  tolerance,
  kind,
  source,
  compute,
});

const yearsOf = (outcome: IntervalOutcome) =>
  outcome.status === 'interval' ? outcome.years : Number.NaN;

const INCH = 25.4;
function lifeOf(actual: number, required: number, rate: number): number {
  const life = thinningLife(actual, required, rate);
  return life.status === 'life' ? life.years : Number.NaN;
}

/** Rates of readings in inches [in/year]. */
function ratesOf(
  readings: readonly (readonly [years: number, inches: number])[],
  take: (rates: CorrosionRates) => number,
): number {
  const rates = corrosionRates(
    readings.map(([years, inches]) => ({ years, thicknessMm: inches * INCH })),
  );
  return rates.status === 'measured' ? take(rates) / INCH : Number.NaN;
}

/** Next date as year and month in one number. */
const monthOf = (last: string, years: number) =>
  Number(monthsAfter(`${last}-01`, wholeMonths(years)).slice(0, 7).replace('-', ''));

const PLACE = [
  [1990, 0.75],
  [1997, 0.742],
  [2003, 0.718],
] as const;

const RULES: readonly CheckRow[] = [
  row(
    'IV-1.1',
    'corrosion remaining life, 18 to 12 mm at 0.4 mm/year',
    15,
    'years',
    1e-9,
    CLOSED,
    () => lifeOf(18, 12, 0.4),
  ),
  ...(
    [
      [15, 7.5],
      [30, 10],
      [1.5, 1.5],
      [3, 2],
    ] as const
  ).map(([life, interval], i) =>
    row(
      `IV-2.${i + 1}`,
      `vessel, remaining life ${life} years`,
      interval,
      'years',
      1e-9,
      API_510,
      () => yearsOf(vesselInternalInterval(life)),
    ),
  ),
  ...(
    [
      [1, 5],
      [2, 7.5],
      [3, 7.5],
    ] as const
  ).map(([pipingClass, interval]) =>
    row(
      `IV-3.${pipingClass}`,
      `piping class ${pipingClass}, thickness, remaining life 15 years`,
      interval,
      'years',
      1e-9,
      API_570,
      () => yearsOf(pipingThicknessInterval(pipingClass, 15)),
    ),
  ),
  ...(
    [
      [1, 5],
      [2, 5],
      [3, 10],
    ] as const
  ).map(([pipingClass, interval]) =>
    row(
      `IV-4.${pipingClass}`,
      `piping class ${pipingClass}, external visual`,
      interval,
      'years',
      0,
      API_570,
      () => yearsOf(pipingVisualInterval(pipingClass)),
    ),
  ),
  row(
    'IV-5.1',
    'half of 8 years from detectable to critical',
    4,
    'years',
    1e-9,
    ['published table', 'Eurocode 9, 2.3.2'],
    () => yearsOf(growthWindowInterval(8)),
  ),
  row('IV-5.2', 'life of 24 years over a factor of 3', 8, 'years', 1e-9, PRACTICE, () =>
    yearsOf(factoredLifeInterval(24, 3)),
  ),
];

const GUIDE_ROWS: readonly CheckRow[] = [
  row('IV-6.1', 'corrosion rate over 15 years', 0.005, 'in/year', 1e-9, GUIDE, () =>
    ratesOf(
      [
        [0, 0.75],
        [15, 0.675],
      ],
      ({ governingMmPerYear }) => governingMmPerYear,
    ),
  ),
  row(
    'IV-6.2',
    'corrosion rate over 22 years',
    3.2,
    'mil/year',
    0.01,
    GUIDE,
    () =>
      1000 *
      ratesOf(
        [
          [0, 0.48],
          [22, 0.41],
        ],
        ({ governingMmPerYear }) => governingMmPerYear,
      ),
  ),
  row('IV-6.3', 'corrosion rate over 53 months', 0.01, 'in/year', 0.005, GUIDE, () =>
    ratesOf(
      [
        [0, 0.565],
        [53 / 12, 0.521],
      ],
      ({ governingMmPerYear }) => governingMmPerYear,
    ),
  ),
  row('IV-6.4', 'remaining life, 0.198 to 0.150 in', 6.9, 'years', 0.007, GUIDE, () =>
    lifeOf(0.198 * INCH, 0.15 * INCH, 0.007 * INCH),
  ),
  row('IV-6.5', 'remaining life, 0.211 to 0.150 in', 20.3, 'years', 0.003, GUIDE, () =>
    lifeOf(0.211 * INCH, 0.15 * INCH, 0.003 * INCH),
  ),
  row('IV-6.6', 'short-term rate of three readings', 0.004, 'in/year', 1e-9, GUIDE, () =>
    ratesOf(PLACE, ({ shortTermMmPerYear }) => shortTermMmPerYear),
  ),
  row('IV-6.7', 'long-term rate of the same', 0.002461538461538462, 'in/year', 1e-9, GUIDE, () =>
    ratesOf(PLACE, ({ longTermMmPerYear }) => longTermMmPerYear),
  ),
  row('IV-6.8', 'governing rate of the same', 0.004, 'in/year', 1e-9, GUIDE, () =>
    ratesOf(PLACE, ({ governingMmPerYear }) => governingMmPerYear),
  ),
  ...(
    [
      [14, 7],
      [18.7, 9.35],
      [9, 4.5],
      [20, 10],
      [11.2, 5.6],
    ] as const
  ).map(([life, interval], i) =>
    row(
      `IV-7.${i + 1}`,
      `interval, remaining life ${life} years`,
      interval,
      'years',
      1e-9,
      GUIDE,
      () => yearsOf(vesselInternalInterval(life)),
    ),
  ),
  ...(
    [
      ['2003-03', 7, 201_003],
      ['2001-04', 9.35, 201_008],
      ['2002-02', 4.5, 200_608],
      ['2003-09', 2.75, 200_606],
      ['2001-11', 10, 201_111],
    ] as const
  ).map(([last, interval, month], i) =>
    row(
      `IV-8.${i + 1}`,
      `next date, ${interval} years after ${last}, whole months rounded down`,
      month,
      'yyyymm',
      0,
      GUIDE,
      () => monthOf(last, interval),
    ),
  ),
  row(
    'IV-8.6',
    'next date, 5.6 years after 2003-05 (the answer key rounds up to 2009-01)',
    200_812,
    'yyyymm',
    0,
    ['closed form', 'whole months rounded down, so that no date is late'],
    () => monthOf('2003-05', 5.6),
  ),
];

export const INTERVAL_CHECKS: readonly CheckRow[] = [...RULES, ...GUIDE_ROWS];
