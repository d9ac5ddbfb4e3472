import { inject } from '@angular/core';
import { Router, type CanMatchFn, type Routes } from '@angular/router';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { needs } from '../session/signed-in';
import { groups } from './groups';

const isGroup: CanMatchFn = (_route, [group]) => groups.some(({ key }) => key === group?.path);
const isWorking: CanMatchFn = (_route, [group, key]) =>
  workingNamed(key?.path ?? '')?.group === group?.path && group !== undefined;

export const workingsRoutes: Routes = [
  {
    path: '',
    canActivate: [needs('calculate')],
    children: [
      {
        path: '',
        pathMatch: 'full',
        title: 'Workings',
        loadComponent: async () => (await import('./list/workings-page')).WorkingsPage,
      },
      {
        path: 'wiring/wiring-map',
        title: 'Wiring map',
        loadComponent: async () => (await import('../wiring/wiring')).WiringPage,
      },
      // A group opens with its first working, and takes along what the address says of the case.
      {
        path: ':group',
        pathMatch: 'full',
        canMatch: [isGroup],
        redirectTo: ({ params, queryParams }) => {
          const first = groups.find(({ key }) => key === params['group'])?.workings[0];
          return inject(Router).createUrlTree(['/workings', params['group'], first?.key ?? ''], {
            queryParams,
          });
        },
      },
      {
        path: ':group/:key',
        canMatch: [isWorking],
        loadComponent: async () => (await import('./working/working-page')).WorkingPage,
      },
    ],
  },
];
