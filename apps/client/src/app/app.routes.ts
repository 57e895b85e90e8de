import type { Routes } from '@angular/router';
import { signedInGuard } from './core/session/signed-in-guard';

/** Pages behind the sign-in, one lazy feature a line. */
const pages: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'today' },
  { path: 'inspections', loadChildren: () => import('./features/inspections/inspections.routes') },
  { path: 'register', loadChildren: () => import('./features/register/register.routes') },
  { path: 'flaws', loadChildren: () => import('./features/flaws/flaws.routes') },
  { path: 'materials', loadChildren: () => import('./features/materials/materials.routes') },
  {
    path: 'growth-laws',
    loadChildren: () => import('./features/growth-laws/growth-laws.routes'),
  },
  {
    path: 'assessments',
    loadChildren: () => import('./features/assessments/assessments.routes'),
  },
  { path: 'today', loadChildren: () => import('./features/today/today.routes') },
  { path: 'schedule', loadChildren: () => import('./features/schedule/schedule.routes') },
  { path: 'mailbox', loadChildren: () => import('./features/mailbox/mailbox.routes') },
  {
    path: 'register-import',
    loadChildren: () => import('./features/register-import/register-import.routes'),
  },
  { path: 'checks', loadChildren: () => import('./features/checks/checks.routes') },
  { path: 'history', loadChildren: () => import('./features/history/history.routes') },
  { path: 'people', loadChildren: () => import('./features/people/people.routes') },
  { path: 'site-rules', loadChildren: () => import('./features/site-rules/site-rules.routes') },
  { path: 'account', loadChildren: () => import('./features/account/account.routes') },
  {
    path: 'not-allowed',
    title: 'Not allowed',
    loadComponent: () => import('./features/sign-in/not-allowed').then((m) => m.NotAllowed),
  },
];

export const routes: Routes = [
  { path: '', loadChildren: () => import('./features/sign-in/sign-in.routes') },
  {
    path: '',
    canActivate: [signedInGuard],
    loadComponent: () => import('./core/shell/shell').then((m) => m.Shell),
    children: [
      ...pages,
      {
        path: '**',
        title: 'Not found',
        loadComponent: () => import('./features/sign-in/not-found').then((m) => m.NotFound),
      },
    ],
  },
];
