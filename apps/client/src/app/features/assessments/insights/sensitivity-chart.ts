import type {
  Sensitivity,
  SensitivityRow,
  Shifted,
} from '@ligament/domain/assessment/analyses/sensitivity';
import type { EChartsCoreOption } from 'echarts/core';
import type { TwinTable } from '../../../shared/drawing/twin-table';

/** What is moved: the reserve on load, or the remaining life. */
export type Moved = 'reserve' | 'life';

const pick = (moved: Moved, shifted: Shifted): number | null =>
  moved === 'reserve' ? shifted.reserveOnLoad : shifted.years;

const AXIS = { reserve: 'reserve factor on load', life: 'remaining life, years' } as const;

/** Rows that have both figures, in the order of their swing. */
export function movedRows({ rows }: Sensitivity, moved: Moved): readonly SensitivityRow[] {
  const swing = (row: SensitivityRow) =>
    Math.abs((pick(moved, row.low) ?? 0) - (pick(moved, row.high) ?? 0));
  return rows
    .filter((row) => pick(moved, row.low) !== null && pick(moved, row.high) !== null)
    .filter((row) => swing(row) > 1e-9)
    .sort((x, y) => swing(y) - swing(x));
}

/** One bar an input, from what its low value gives to what its high value gives. */
export function sensitivityChart(found: Sensitivity, moved: Moved): EChartsCoreOption {
  // an axis of categories counts from below
  const rows = [...movedRows(found, moved)].reverse();
  const ends = rows.map((row) => {
    const [low, high] = [pick(moved, row.low) ?? 0, pick(moved, row.high) ?? 0];
    return { from: Math.min(low, high), to: Math.max(low, high), falls: high < low };
  });
  const base = moved === 'reserve' ? found.reserveOnLoad : (found.years ?? 0);
  return {
    grid: { left: 170, right: 24, top: 16, bottom: 44 },
    xAxis: {
      type: 'value',
      scale: true,
      name: AXIS[moved],
      nameLocation: 'middle',
      nameGap: 28,
      splitLine: { show: true },
    },
    yAxis: { type: 'category', data: rows.map(({ name }) => name) },
    tooltip: { show: false },
    series: [
      {
        type: 'bar',
        stack: 'range',
        silent: true,
        itemStyle: { color: 'transparent' },
        data: ends.map(({ from }) => from),
      },
      {
        type: 'bar',
        stack: 'range',
        barWidth: 14,
        itemStyle: { color: 'var(--steel)' },
        data: ends.map(({ from, to }) => to - from),
        markLine: {
          symbol: 'none',
          silent: true,
          lineStyle: { color: 'var(--ink)', type: 'solid' },
          label: { formatter: 'as given', color: 'var(--ink)' },
          data: [{ xAxis: base }],
        },
      },
    ],
  };
}

/** The same as numbers. */
export function sensitivityTable({ rows }: Sensitivity): TwinTable {
  return {
    columns: [
      { label: 'Input' },
      { label: 'Change' },
      { label: 'Low value', digits: 2 },
      { label: 'High value', digits: 2 },
      { label: 'Unit' },
      { label: 'Reserve at low', digits: 3 },
      { label: 'Reserve at high', digits: 3 },
      { label: 'Life at low', unit: 'years', digits: 2 },
      { label: 'Life at high', unit: 'years', digits: 2 },
    ],
    rows: rows.map(({ name, change, unit, low, high }) => [
      name,
      change,
      low.value,
      high.value,
      unit,
      low.reserveOnLoad,
      high.reserveOnLoad,
      low.years,
      high.years,
    ]),
  };
}
