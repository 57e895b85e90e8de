import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** What went wrong, in words, with the fields at fault. */
@Component({
  selector: 'app-problem-notice',
  template: `
    @if (problem(); as each) {
      <div class="notice bad" role="alert">
        <strong>{{ each.title }}.</strong> {{ each.detail }}
        @if (each.errors.length > 1) {
          <ul>
            @for (error of each.errors; track error.field + error.message) {
              <li>{{ error.field }}: {{ error.message }}</li>
            }
          </ul>
        }
        <ng-content />
      </div>
    }
  `,
  styles: `
    ul {
      margin: 4px 0 0;
      padding-left: 20px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProblemNotice {
  readonly problem = input.required<{
    readonly title: string;
    readonly detail: string;
    readonly errors: readonly { readonly field: string; readonly message: string }[];
  } | null>();
}
