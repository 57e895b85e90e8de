import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const routes: Routes = [
  {
    path: '',
    title: 'Site rules',
    loadComponent: () => import('./site-rules-page').then((m) => m.SiteRulesPage),
  },
  {
    path: 'new',
    title: 'New version of the site rules',
    canActivate: [actionGuard('rules.write')],
    loadComponent: () => import('./record-site-rules').then((m) => m.RecordSiteRules),
  },
];

export default routes;
