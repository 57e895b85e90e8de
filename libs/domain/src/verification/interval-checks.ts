import { monthsAfter } from '../scheduling/calendar-date';
import { wholeMonths, type IntervalOutcome } from '../scheduling/interval-outcome';
import {
  factoredLifeInterval,
  growthWindowInterval,
  pipingThicknessInterval,
  pipingVisualInterval,
  vesselInternalInterval,
} from '../scheduling/interval-rules';
import type { CheckRow } from './check-row';

const API_510 = ['from memory', 'API 510, 6.5.1 (from memory)'] as const;
const API_570 = ['published table', 'API 570, Table 2, as quoted by a county regulator'] as const;
const GUIDE = [
  'published table',
  'answer key of a study guide for pressure equipment inspectors',
] as const;
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

/** Next date as year and month in one number. */
const monthOf = (last: string, years: number) =>
  Number(monthsAfter(`${last}-01`, wholeMonths(years)).slice(0, 7).replace('-', ''));

const RULES: readonly CheckRow[] = [
  ...(
    [
      [15, 7.5],
      [30, 10],
      [1.5, 1.5],
      [3, 2],
    ] as const
  ).map(([life, interval], i) =>
    row(
      `IV-1.${i + 1}`,
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
      `IV-2.${pipingClass}`,
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
      `IV-3.${pipingClass}`,
      `piping class ${pipingClass}, external visual`,
      interval,
      'years',
      0,
      API_570,
      () => yearsOf(pipingVisualInterval(pipingClass)),
    ),
  ),
  row(
    'IV-4.1',
    'half of 8 years from detectable to critical',
    4,
    'years',
    1e-9,
    ['published table', 'Eurocode 9, 2.3.2'],
    () => yearsOf(growthWindowInterval(8)),
  ),
  row('IV-4.2', 'life of 24 years over a factor of 3', 8, 'years', 1e-9, PRACTICE, () =>
    yearsOf(factoredLifeInterval(24, 3)),
  ),
];

const GUIDE_ROWS: readonly CheckRow[] = [
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
      `IV-5.${i + 1}`,
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
      `IV-6.${i + 1}`,
      `next date, ${interval} years after ${last}, whole months rounded down`,
      month,
      'yyyymm',
      0,
      GUIDE,
      () => monthOf(last, interval),
    ),
  ),
  row(
    'IV-6.6',
    'next date, 5.6 years after 2003-05 (the answer key rounds up to 2009-01)',
    200_812,
    'yyyymm',
    0,
    ['closed form', 'whole months rounded down, so that no date is late'],
    () => monthOf('2003-05', 5.6),
  ),
];

export const INTERVAL_CHECKS: readonly CheckRow[] = [...RULES, ...GUIDE_ROWS];
