import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** A key figure: never bare, always with its unit and, where there is one, its uncertainty. */
export interface Figure {
  readonly label: string;
  readonly value: string;
  readonly unit?: string;
  /** Uncertainty or side remark, e.g. `± 0.7`. */
  readonly beside?: string;
  /** A second line: what the figure holds for, or hangs on. */
  readonly note?: string;
  readonly tone?: 'good' | 'warn' | 'bad';
}

/** Key figures in one row. */
@Component({
  selector: 'app-figure-strip',
  template: `
    <dl>
      @for (figure of figures(); track figure.label) {
        <div>
          <dt>{{ figure.label }}</dt>
          <dd [class]="figure.tone ?? ''">
            <strong>{{ figure.value }}</strong>
            @if (figure.beside; as beside) {
              <span> {{ beside }}</span>
            }
            @if (figure.unit; as unit) {
              <span> {{ unit }}</span>
            }
            @if (figure.note; as note) {
              <small>{{ note }}</small>
            }
          </dd>
        </div>
      }
    </dl>
  `,
  styles: `
    :host {
      display: block;
      margin-bottom: 16px;
    }
    dl {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(132px, 1fr));
      margin: 0;
      background: var(--sheet);
      border: 1px solid var(--rule);
      border-radius: var(--radius);
      gap: 1px;
      overflow: hidden;
    }
    div {
      padding: 10px 16px;
      outline: 1px solid var(--rule);
    }
    dt {
      color: var(--ink-2);
      font-size: 12px;
    }
    dd {
      margin: 2px 0 0;
    }
    strong {
      font-size: 19px;
      font-weight: 600;
    }
    dd span {
      margin-left: 1px;
      color: var(--ink-2);
      font-size: 12px;
      white-space: nowrap;
    }
    small {
      display: block;
      color: var(--ink-2);
      font-size: 12px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FigureStrip {
  readonly figures = input.required<readonly Figure[]>();
}
