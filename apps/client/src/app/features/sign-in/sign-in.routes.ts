import type { Routes } from '@angular/router';

const routes: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in',
    loadComponent: () => import('./sign-in').then((m) => m.SignIn),
  },
  { path: 'setup', title: 'Set up', loadComponent: () => import('./set-up').then((m) => m.SetUp) },
  {
    path: 'accept/:token',
    title: 'Accept the invitation',
    loadComponent: () => import('./accept-invitation').then((m) => m.AcceptInvitation),
  },
  {
    path: 'reset-password',
    title: 'Forgotten password',
    loadComponent: () => import('./request-reset').then((m) => m.RequestReset),
  },
  {
    path: 'reset-password/:token',
    title: 'New password',
    loadComponent: () => import('./set-password').then((m) => m.SetPassword),
  },
];

export default routes;
