import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const form = () => import('./component-form').then((m) => m.ComponentForm);

const routes: Routes = [
  {
    path: '',
    title: 'Register',
    loadComponent: () => import('./component-list').then((m) => m.ComponentList),
  },
  {
    path: 'units',
    title: 'Units',
    loadComponent: () => import('./unit-list').then((m) => m.UnitList),
  },
  {
    path: 'new',
    title: 'Add a component',
    canActivate: [actionGuard('register.write')],
    loadComponent: form,
  },
  {
    path: ':id',
    title: 'Component',
    loadComponent: () => import('./component-page').then((m) => m.ComponentPage),
  },
  {
    path: ':id/change',
    title: 'Change a component',
    canActivate: [actionGuard('register.write')],
    loadComponent: form,
  },
];

export default routes;
