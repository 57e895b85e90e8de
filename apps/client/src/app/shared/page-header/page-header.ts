import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';

export interface Crumb {
  readonly label: string;
  readonly link?: string | readonly string[];
}

/** Where the reader is, the page's heading, and its actions at the right. */
@Component({
  selector: 'app-page-header',
  imports: [RouterLink],
  template: `
    @if (crumbs().length > 0) {
      <nav aria-label="Where you are">
        @for (crumb of crumbs(); track crumb.label; let last = $last) {
          @if (crumb.link) {
            <a [routerLink]="crumb.link">{{ crumb.label }}</a>
          } @else {
            <span>{{ crumb.label }}</span>
          }
          @if (!last) {
            <span aria-hidden="true"> / </span>
          }
        }
      </nav>
    }
    <div class="row">
      <h1>{{ title() }}</h1>
      <ng-content select="[chip]" />
      <div class="actions no-print"><ng-content /></div>
    </div>
  `,
  styles: `
    :host {
      display: block;
      margin-bottom: 14px;
    }
    nav {
      color: var(--ink-2);
      font-size: 13px;
      margin-bottom: 4px;
    }
    nav a {
      color: inherit;
      text-decoration: none;
    }
    nav a:hover {
      text-decoration: underline;
    }
    .row {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 8px 12px;
    }
    .actions {
      margin-left: auto;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PageHeader {
  readonly title = input.required<string>();
  readonly crumbs = input<readonly Crumb[]>([]);
}
