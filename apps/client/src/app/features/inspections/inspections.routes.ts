import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const form = () => import('./inspection-form').then((m) => m.InspectionForm);

const routes: Routes = [
  {
    path: '',
    title: 'Inspections',
    loadComponent: () => import('./inspection-list').then((m) => m.InspectionList),
  },
  {
    path: 'new',
    title: 'New inspection',
    canActivate: [actionGuard('inspections.plan')],
    loadComponent: form,
  },
  {
    path: 'imports/:id',
    title: 'Import',
    loadComponent: () => import('./import/import-page').then((m) => m.ImportPage),
  },
  {
    path: ':id',
    title: 'Inspection',
    loadComponent: () => import('./inspection-page').then((m) => m.InspectionPage),
  },
  {
    path: ':id/edit',
    title: 'Change inspection',
    canActivate: [actionGuard('inspections.write')],
    loadComponent: form,
  },
];

export default routes;
