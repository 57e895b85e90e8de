import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const form = () => import('./material-form').then((m) => m.MaterialForm);

const routes: Routes = [
  {
    path: '',
    title: 'Materials',
    loadComponent: () => import('./material-list').then((m) => m.MaterialList),
  },
  {
    path: 'new',
    title: 'Add a material',
    canActivate: [actionGuard('materials.write')],
    loadComponent: form,
  },
  {
    path: ':id',
    title: 'Material',
    loadComponent: () => import('./material-page').then((m) => m.MaterialPage),
  },
  {
    path: ':id/change',
    title: 'Change a material',
    canActivate: [actionGuard('materials.write')],
    loadComponent: form,
  },
];

export default routes;
