import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { EChartsCoreOption, ECElementEvent } from 'echarts/core';
import { NgxEchartsDirective, provideEchartsCore } from 'ngx-echarts';
import { dressOptions } from './dress-options';

/** A chart, as SVG. Stands inside an app-drawing, which shows the same numbers as a table. */
@Component({
  selector: 'app-chart',
  imports: [NgxEchartsDirective],
  providers: [provideEchartsCore({ echarts: () => import('./echarts-set') })],
  template: `<div
    echarts
    role="img"
    [attr.aria-label]="label()"
    [style.height.px]="height()"
    [options]="dressed()"
    [initOpts]="initOpts"
    (chartClick)="pointChosen.emit($event)"
  ></div>`,
  styles: ':host { display: block; min-width: 0; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Chart {
  /** ECharts options; colours as the page's tokens, e.g. `var(--steel)`. */
  readonly options = input.required<EChartsCoreOption>();
  /** What the chart shows, in one sentence, for those who do not see it. */
  readonly label = input.required<string>();
  readonly height = input(300);
  readonly pointChosen = output<ECElementEvent>();
  protected readonly initOpts = { renderer: 'svg' } as const;
  protected readonly dressed = computed(() => dressOptions(this.options()));
}
