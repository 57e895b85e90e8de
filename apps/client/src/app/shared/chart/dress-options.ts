import type { EChartsCoreOption } from 'echarts/core';
import { cellText } from '../drawing/twin-table';
import type { Cell } from '../table/csv-text';

type Part = Readonly<Record<string, unknown>>;

const CAPTION = { color: 'var(--ink-2)', fontSize: 11 };

/** An axis as a draughtsman rules it: one line, short ticks, no grid unless asked for. */
const AXIS = {
  axisLine: { show: true, lineStyle: { color: 'var(--ink-2)' } },
  axisTick: { lineStyle: { color: 'var(--ink-2)' } },
  axisLabel: CAPTION,
  nameTextStyle: CAPTION,
  splitLine: { show: false, lineStyle: { color: 'var(--rule)' } },
} satisfies Part;

/**
 * Gives a chart's options the look of the house. Colours are custom properties of the page, so a chart follows the
 * theme and the printer without being drawn again.
 */
export function dressOptions(options: EChartsCoreOption): EChartsCoreOption {
  const own = options as Part;
  return {
    ...own,
    animation: false,
    textStyle: {
      fontFamily: 'Inter, system-ui, sans-serif',
      color: 'var(--ink)',
      ...part(own['textStyle']),
    },
    tooltip: {
      // never HTML: a label may hold what a person typed
      renderMode: 'richText',
      confine: true,
      backgroundColor: 'var(--sheet)',
      borderColor: 'var(--rule-strong)',
      borderWidth: 1,
      shadowBlur: 0,
      valueFormatter: (value: unknown) => cellText(value as Cell, 3),
      ...part(own['tooltip']),
      textStyle: { color: 'var(--ink)', fontSize: 12, ...part(part(own['tooltip'])['textStyle']) },
    },
    xAxis: each(own['xAxis'], (axis) => under(AXIS, axis)),
    yAxis: each(own['yAxis'], (axis) => under(AXIS, axis)),
    // a highlight would compute with the colours, which only the page knows
    series: each(own['series'], (series) => under({ emphasis: { disabled: true } }, series)),
  };
}

const part = (value: unknown): Part =>
  value !== null && typeof value === 'object' && !Array.isArray(value) ? (value as Part) : {};

function each(value: unknown, change: (one: Part) => Part): unknown {
  if (Array.isArray(value)) return value.map((one) => change(part(one)));
  return value === undefined ? undefined : change(part(value));
}

/** Puts defaults under what is given, part by part. */
function under(defaults: Part, given: Part): Part {
  const names = new Set([...Object.keys(defaults), ...Object.keys(given)]);
  return Object.fromEntries(
    [...names].map((name) => {
      const [low, high] = [defaults[name], given[name]];
      if (high === undefined) return [name, low];
      const both = Object.keys(part(low)).length > 0 && Object.keys(part(high)).length > 0;
      return [name, both ? under(part(low), part(high)) : high];
    }),
  );
}
