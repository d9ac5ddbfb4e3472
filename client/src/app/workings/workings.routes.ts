import type { CanMatchFn, Routes } from '@angular/router';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { needs } from '../session/signed-in';
import { groups } from './groups';

const isWorking: CanMatchFn = (_route, [group, key]) =>
  group !== undefined && workingNamed(key?.path ?? '')?.group === group.path;

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
      // A group opens with its first working, and takes along what the address says of a case.
      ...groups.map(({ key, workings }) => ({
        path: key,
        pathMatch: 'full' as const,
        redirectTo: `${key}/${workings[0]?.key ?? ''}`,
      })),
      {
        path: ':group/:key',
        canMatch: [isWorking],
        loadComponent: async () => (await import('./working/working-page')).WorkingPage,
      },
    ],
  },
];
