import type { Routes } from '@angular/router';
import { Frame } from './frame';
import { provideIcons } from './icons';

/** Every page inside the frame, for signed-in people. Each feature is downloaded when it is first opened. */
export const frameRoutes: Routes = [
  {
    path: '',
    component: Frame,
    providers: [provideIcons()],
    children: [
      { path: 'sheets', loadChildren: async () => (await import('../sheets/sheets.routes')).sheetsRoutes },
      {
        path: 'workings',
        loadChildren: async () => (await import('../wiring/wiring.routes')).wiringRoutes,
      },
      {
        path: '**',
        title: 'Not found',
        loadComponent: async () => (await import('../not-found/not-found')).NotFoundPage,
      },
    ],
  },
];
