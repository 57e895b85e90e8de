import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const routes: Routes = [
  {
    path: '',
    title: 'Mailbox',
    canActivate: [actionGuard('mail.read')],
    loadComponent: () => import('./mailbox').then((m) => m.Mailbox),
  },
  {
    path: ':id',
    title: 'Mail',
    canActivate: [actionGuard('mail.read')],
    loadComponent: () => import('./mail-page').then((m) => m.MailPage),
  },
];

export default routes;
