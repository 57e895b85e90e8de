import type { Routes } from '@angular/router';

const routes: Routes = [
  {
    path: '',
    title: 'Password and sessions',
    loadComponent: () => import('./account').then((m) => m.Account),
  },
];

export default routes;
