import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const form = () => import('./window-form').then((m) => m.WindowForm);

const routes: Routes = [
  {
    path: '',
    title: 'Schedule',
    loadComponent: () => import('./schedule').then((m) => m.Schedule),
  },
  {
    path: 'windows',
    title: 'Shutdown windows',
    loadComponent: () => import('./window-list').then((m) => m.WindowList),
  },
  {
    path: 'windows/new',
    title: 'New window',
    canActivate: [actionGuard('windows.write')],
    loadComponent: form,
  },
  { path: 'windows/:id', title: 'Shutdown window', loadComponent: form },
  {
    path: 'reminders',
    title: 'Reminders',
    canActivate: [actionGuard('reminders.read')],
    loadComponent: () => import('./reminder-list').then((m) => m.ReminderList),
  },
  {
    path: ':id',
    title: 'Re-inspection',
    loadComponent: () => import('./reinspection-page').then((m) => m.ReinspectionPage),
  },
];

export default routes;
