import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';
import { keepUnsaved } from './keep-unsaved';

const routes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: '/flaws' },
  {
    path: ':id',
    title: 'Assessment',
    canActivate: [actionGuard('assessments.read')],
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./assessment-page').then((m) => m.AssessmentPage),
  },
];

export default routes;
