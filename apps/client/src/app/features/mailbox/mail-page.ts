import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { readMail } from '@ligament/domain/contract/reminders';
import { switchMap } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { LoadingState } from '../../shared/states/loading-state';

/** One mail of the built-in mailbox. */
@Component({
  selector: 'app-mail-page',
  imports: [PageHeader, MomentPipe, ProblemNotice, LoadingState],
  template: `
    @let shown = mail();
    @switch (shown.state) {
      @case ('loading') {
        <app-loading what="the mail" />
      }
      @case ('failed') {
        <app-problem-notice [problem]="shown.problem" />
      }
      @case ('ready') {
        <app-page-header
          [title]="shown.value.subject"
          [crumbs]="[{ label: 'Mailbox', link: '/mailbox' }]"
        />
        <section class="sheet">
          <p class="caption">
            To {{ shown.value.recipients }}, from {{ shown.value.sender }},
            {{ shown.value.receivedAt | moment: timeZone }}, {{ shown.value.messageId }}
          </p>
          <pre>{{ shown.value.text }}</pre>
        </section>
      }
    }
  `,
  styles: 'pre { font: inherit; white-space: pre-wrap; overflow-wrap: anywhere; margin: 0; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MailPage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  protected readonly timeZone = inject(Session).site()?.timeZone;
  protected readonly mail = toSignal(
    toObservable(this.id).pipe(
      switchMap((id) => loadable(this.api.call(readMail, { params: { id } }))),
    ),
    { initialValue: LOADING },
  );
}
