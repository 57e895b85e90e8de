import type { Routes } from '@angular/router';

const routes: Routes = [
  { path: '', title: 'Checks', loadComponent: () => import('./checks').then((m) => m.Checks) },
];

export default routes;
