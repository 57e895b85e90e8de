import type { Routes } from '@angular/router';
import { actionGuard } from '../../core/session/action-guard';

const routes: Routes = [
  {
    path: '',
    title: 'People',
    canActivate: [actionGuard('people.read')],
    loadComponent: () => import('./people-list').then((m) => m.PeopleList),
  },
  {
    path: 'invite',
    title: 'Invite a person',
    canActivate: [actionGuard('people.write')],
    loadComponent: () => import('./invite-person').then((m) => m.InvitePerson),
  },
  {
    path: ':id',
    title: 'Person',
    canActivate: [actionGuard('people.read')],
    loadComponent: () => import('./person-page').then((m) => m.PersonPage),
  },
];

export default routes;
