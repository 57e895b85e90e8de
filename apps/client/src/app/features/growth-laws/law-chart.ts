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

const RAISED = [...'⁰¹²³⁴⁵⁶⁷⁸⁹'];

/** A decade of a logarithmic scale: 0.001 as 10⁻³. */
export function decade(value: number): string {
  const exponent = Math.round(Math.log10(value));
  const digits = [...String(Math.abs(exponent))]
    .map((digit) => RAISED[Number(digit)] ?? '')
    .join('');
  return exponent === 0 ? '1' : `10${exponent < 0 ? '⁻' : ''}${digits}`;
}

/** Growth per cycle over the range of stress intensity, both logarithmic: one law drawn out, the others faint behind it. */
export function lawChart(
  laws: readonly GrowthLawView[],
  chosen: string | undefined,
): EChartsCoreOption {
  return {
    grid: { left: 64, right: 24, top: 28, bottom: 44 },
    xAxis: {
      type: 'log',
      min: LOWEST,
      max: HIGHEST,
      name: 'ΔK [MPa√mm]',
      nameLocation: 'middle',
      nameGap: 28,
    },
    yAxis: {
      type: 'log',
      min: 1e-9,
      max: 1,
      name: 'da/dN [mm/cycle]',
      axisLabel: { formatter: decade },
      splitLine: { show: true },
    },
    series: laws.map((law) => lineOf(law, law.id === chosen)),
  };
}

function lineOf(law: GrowthLawView, drawnOut: boolean): Readonly<Record<string, unknown>> {
  const color = drawnOut ? 'var(--steel)' : 'var(--rule-strong)';
  return {
    type: 'line',
    name: law.title,
    data: pointsOf(law),
    symbol: 'none',
    silent: true,
    z: drawnOut ? 3 : 2,
    lineStyle: { color, width: drawnOut ? 2.5 : 1 },
    itemStyle: { color },
    endLabel: {
      show: drawnOut,
      formatter: law.key,
      color: 'var(--steel)',
      fontSize: 12,
      align: 'right',
      offset: [-12, -16],
    },
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
