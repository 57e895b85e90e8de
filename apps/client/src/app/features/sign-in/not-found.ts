import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { PageHeader } from '../../shared/page-header/page-header';

@Component({
  selector: 'app-not-found',
  imports: [PageHeader, RouterLink],
  template: `<app-page-header title="There is no such page" />
    <p>
      The address may be mistyped, or the record is on another site.
      <a routerLink="/today">Go to Today</a>
    </p>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFound {}
