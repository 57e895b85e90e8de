import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const routes: Routes = [
  {
    path: '',
    title: 'Flaws',
    canActivate: [actionGuard('flaws.read')],
    loadComponent: () => import('./flaw-list').then((m) => m.FlawList),
  },
  {
    path: ':id',
    title: 'Flaw',
    canActivate: [actionGuard('flaws.read')],
    loadComponent: () => import('./flaw-page').then((m) => m.FlawPage),
  },
  {
    path: ':id/change',
    title: 'Change a flaw',
    canActivate: [actionGuard('flaws.write')],
    loadComponent: () => import('./change-flaw').then((m) => m.ChangeFlaw),
  },
];

export default routes;
