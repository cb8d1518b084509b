import { inject } from '@angular/core';
import { type CanActivateFn, Router, type Routes } from '@angular/router';

import { Session } from './account/session';

/** Pages behind sign-in: who is not signed in goes there, and comes back to the address asked for. */
const signedIn: CanActivateFn = (_route, state) => {
  const session = inject(Session);
  return session.user()
    ? true
    : inject(Router).createUrlTree(['/sign-in'], { queryParams: { then: state.url } });
};

const toFirstCrew: CanActivateFn = () => {
  const [first] = inject(Session).memberships();
  return inject(Router).createUrlTree(first ? ['/crews', first.crewId, 'shoots'] : ['/sign-in']);
};

const frame = () => import('./shell/page-frame').then(m => m.PageFrame);

export const routes: Routes = [
  { path: 'sign-in', title: 'Sign in', loadComponent: () => import('./account/sign-in').then(m => m.SignIn) },
  {
    path: 'crews/:crewId/moves/:moveId',
    title: 'Move',
    canActivate: [signedIn],
    loadComponent: () => import('./designer/designer').then(m => m.Designer),
  },
  {
    path: 'crews/:crewId',
    canActivate: [signedIn],
    loadComponent: frame,
    children: [
      { path: 'shoots', title: 'Shoots', loadComponent: () => import('./shoots/shoots').then(m => m.Shoots) },
      {
        path: 'shoots/:shootId',
        title: 'Shoot',
        loadComponent: () => import('./shoots/shoot').then(m => m.ShootPage),
      },
      {
        path: 'shots/:shotId',
        title: 'Shot',
        loadComponent: () => import('./shots/shot').then(m => m.ShotPage),
      },
      { path: '', pathMatch: 'full', redirectTo: 'shoots' },
    ],
  },
  { path: '', pathMatch: 'full', canActivate: [signedIn, toFirstCrew], children: [] },
  {
    path: '**',
    loadComponent: frame,
    children: [
      {
        path: '**',
        title: 'Not found',
        loadComponent: () => import('./shell/not-found').then(m => m.NotFound),
      },
    ],
  },
];
