import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

/** Below a list: the way to its next page, and back to the first. */
@Component({
  selector: 'app-pager',
  imports: [MatButtonModule],
  template: `
    @if (cursor() || nextCursor()) {
      <div class="actions">
        @if (cursor()) {
          <button mat-stroked-button type="button" (click)="go.emit(null)">First page</button>
        }
        @if (nextCursor(); as next) {
          <button mat-stroked-button type="button" (click)="go.emit(next)">Next page</button>
        }
      </div>
    }
  `,
  styles: '.actions { padding: 10px 16px; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Pager {
  readonly cursor = input<string | null | undefined>(null);
  readonly nextCursor = input.required<string | null>();
  readonly go = output<string | null>();
}
