import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const routes: Routes = [
  {
    path: '',
    title: 'Import a register',
    canActivate: [actionGuard('register.write')],
    loadComponent: () => import('./register-import').then((m) => m.RegisterImport),
  },
];

export default routes;
