import type { Routes } from '@angular/router';

const routes: Routes = [
  { path: '', title: 'Today', loadComponent: () => import('./today').then((m) => m.Today) },
];

export default routes;
