import type { GrowthLawView } from '@ligament/domain/contract/growth-laws';
import { growthPerCycle } from '@ligament/domain/growth/growth-law';
import type { EChartsCoreOption } from 'echarts/core';
import type { TwinTable } from '../../shared/drawing/twin-table';

const LOWEST = 30;
const HIGHEST = 3000;
const STEPS = 60;
const RANGES = Array.from(
  { length: STEPS + 1 },
  (_each, i) => LOWEST * (HIGHEST / LOWEST) ** (i / STEPS),
);

const DASHES = ['solid', 'dashed', 'dotted', [8, 3, 2, 3], [2, 2], [12, 4]] as const;
const INKS = ['var(--ink)', 'var(--steel)', 'var(--warn-line)', 'var(--good)', 'var(--ink-2)'];

/** Points of a law from its threshold on; below it nothing grows and nothing is drawn. */
function pointsOf(law: GrowthLawView): readonly (readonly [number, number])[] {
  const rate = growthPerCycle({
    stages: law.stages,
    thresholdMPaSqrtMm: law.thresholdMpaSqrtMm,
  });
  const start = law.thresholdMpaSqrtMm > LOWEST ? [law.thresholdMpaSqrtMm] : [];
  return [...start, ...RANGES.filter((range) => range > (start[0] ?? 0))].map(
    (range) => [range, rate(range)] as const,
  );
}

/** Growth per cycle over the range of stress intensity, both on logarithmic scales. */
export function lawChart(laws: readonly GrowthLawView[]): EChartsCoreOption {
  return {
    grid: { left: 64, right: 24, top: 28, bottom: 44 },
    tooltip: { trigger: 'item' },
    xAxis: {
      type: 'log',
      min: LOWEST,
      max: HIGHEST,
      name: 'ΔK [MPa√mm]',
      nameLocation: 'middle',
      nameGap: 28,
    },
    yAxis: { type: 'log', name: 'da/dN [mm/cycle]', splitLine: { show: true } },
    series: laws.map((law, i) => ({
      type: 'line',
      name: law.title,
      data: pointsOf(law),
      symbol: 'none',
      lineStyle: { color: INKS[i % INKS.length], width: 1.5, type: DASHES[i % DASHES.length] },
      itemStyle: { color: INKS[i % INKS.length] },
      endLabel: {
        show: true,
        formatter: law.key,
        color: 'var(--ink)',
        fontSize: 11,
        align: 'right',
        offset: [-8, -10],
      },
    })),
  };
}

const READ_AT = [50, 100, 200, 500, 1000, 2000];

/** The laws read off at round ranges. */
export function lawTwin(laws: readonly GrowthLawView[]): TwinTable {
  const rates = laws.map((law) =>
    growthPerCycle({ stages: law.stages, thresholdMPaSqrtMm: law.thresholdMpaSqrtMm }),
  );
  return {
    columns: [
      { label: 'ΔK', unit: 'MPa√mm', digits: 0 },
      ...laws.map(({ key }) => ({ label: key, unit: 'mm/cycle' })),
    ],
    // as words: a decimal fraction would show these as nought
    rows: READ_AT.map((range) => [range, ...rates.map((rate) => rate(range).toExponential(2))]),
  };
}
