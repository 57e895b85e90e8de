import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';

@Component({
  selector: 'app-not-allowed',
  imports: [PageHeader, RouterLink],
  template: `<app-page-header title="Your role does not include this page" />
    <p>
      You are signed in as {{ session.user()?.role }}. If you need this page, ask your
      administrator.
      <a routerLink="/today">Go to Today</a>
    </p>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotAllowed {
  protected readonly session = inject(Session);
}
