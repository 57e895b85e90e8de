import type { Routes } from '@angular/router';

const page = () => import('./history-page').then((m) => m.HistoryPage);

const routes: Routes = [
  { path: '', title: 'History', loadComponent: page },
  { path: 'components/:component', title: 'History of a component', loadComponent: page },
];

export default routes;
