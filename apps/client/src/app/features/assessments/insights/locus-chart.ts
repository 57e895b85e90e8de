import type { FlawLocus } from '@ligament/domain/assessment/analyses/locus-of-flaw';
import type { LocusEnd } from '@ligament/domain/fracture/limiting-flaw/limiting-locus';
import type { EChartsCoreOption } from 'echarts/core';
import type { TwinTable } from '../../../shared/drawing/twin-table';

const ENDS: Readonly<Record<LocusEnd, string>> = {
  line: 'line of the diagram',
  validity: 'end of the solutions',
  'depth share': 'end of the solutions',
  'none acceptable': 'none acceptable',
};

/** Height against length on the boundary, with the flaw and the box of its sizing allowance. */
export function locusChart({ points, assessed, measured }: FlawLocus): EChartsCoreOption {
  const known = points.filter(({ heightMm }) => heightMm !== null);
  return {
    grid: { left: 56, right: 24, top: 24, bottom: 48 },
    xAxis: { type: 'value', min: 0, name: 'length, mm', nameLocation: 'middle', nameGap: 28 },
    yAxis: { type: 'value', min: 0, name: 'height, mm', splitLine: { show: true } },
    series: [
      {
        type: 'line',
        name: 'limiting height',
        symbol: 'none',
        data: known.map(({ lengthMm, heightMm }) => [lengthMm, heightMm]),
        lineStyle: { color: 'var(--bad)', width: 2 },
        itemStyle: { color: 'var(--bad)' },
        markArea: {
          silent: true,
          itemStyle: { color: 'var(--steel)', opacity: 0.25 },
          data: [
            [
              { coord: [measured.lengthMm, measured.heightMm] },
              { coord: [assessed.lengthMm, assessed.heightMm] },
            ],
          ],
        },
      },
      {
        type: 'scatter',
        name: 'assessed flaw',
        symbolSize: 10,
        data: [[assessed.lengthMm, assessed.heightMm]],
        itemStyle: { color: 'var(--ink)' },
        label: { show: true, position: 'bottom', formatter: 'assessed', color: 'var(--ink)' },
      },
      {
        type: 'scatter',
        name: 'measured flaw',
        symbol: 'emptyCircle',
        symbolSize: 9,
        data: [[measured.lengthMm, measured.heightMm]],
        itemStyle: { color: 'var(--ink-2)' },
      },
    ],
  };
}

/** The boundary as numbers, with what ends each height. */
export const locusTable = ({ points }: FlawLocus): TwinTable => ({
  columns: [
    { label: 'Length', unit: 'mm', digits: 1 },
    { label: 'Limiting height', unit: 'mm', digits: 2 },
    { label: 'Ended by' },
  ],
  rows: points.map(({ lengthMm, heightMm, endedBy }) => [lengthMm, heightMm, ENDS[endedBy]]),
});
