import { dressOptions } from './dress-options';

interface Dressed {
  readonly animation: boolean;
  readonly tooltip: Record<string, unknown> & { valueFormatter: (value: unknown) => string };
  readonly xAxis: Record<string, unknown>;
  readonly yAxis: Record<string, unknown>[];
  readonly series: Record<string, unknown>[];
}

const dressed = (options: object) => dressOptions({ ...options }) as unknown as Dressed;

describe('dressOptions', () => {
  it('draws without animation and with text, never HTML, in the tooltip', () => {
    const { animation, tooltip } = dressed({ tooltip: { trigger: 'axis' } });
    expect(animation).toBe(false);
    expect(tooltip).toMatchObject({ renderMode: 'richText', trigger: 'axis', confine: true });
    expect(tooltip.valueFormatter(0.8500853)).toBe('0.85');
  });

  it('rules every axis and keeps what is given', () => {
    const { xAxis, yAxis } = dressed({
      xAxis: { type: 'value', axisLabel: { formatter: 'x' } },
      yAxis: [{ name: 'Kr' }, { name: 'Lr', splitLine: { show: true } }],
    });
    expect(xAxis).toMatchObject({
      type: 'value',
      axisLabel: { formatter: 'x', color: 'var(--ink-2)' },
      splitLine: { show: false },
    });
    expect(yAxis.map((axis) => axis['name'])).toEqual(['Kr', 'Lr']);
    expect(yAxis[1]).toMatchObject({
      splitLine: { show: true, lineStyle: { color: 'var(--rule)' } },
    });
  });

  it('highlights no series unless it asks for it', () => {
    const { series } = dressed({
      series: [{ type: 'line' }, { type: 'scatter', emphasis: { disabled: false } }],
    });
    expect(series[0]).toEqual({ type: 'line', emphasis: { disabled: true } });
    expect(series[1]).toMatchObject({ emphasis: { disabled: false } });
  });

  it('adds no axis and no series of its own', () => {
    const { xAxis, series } = dressed({});
    expect([xAxis, series]).toEqual([undefined, undefined]);
  });
});
