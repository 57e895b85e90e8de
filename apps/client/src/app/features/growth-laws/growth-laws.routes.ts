import type { Routes } from '@angular/router';

const routes: Routes = [
  {
    path: '',
    title: 'Growth laws',
    loadComponent: () => import('./growth-law-list').then((m) => m.GrowthLawList),
  },
];

export default routes;
