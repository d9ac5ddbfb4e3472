import { inject, provideEnvironmentInitializer } from '@angular/core';
import type { Routes } from '@angular/router';
import { WaitingTray } from '../offline/waiting-tray';
import { needs } from '../session/signed-in';
import { Frame } from './frame';
import { provideIcons } from './icons';

/** Every page inside the frame, for signed-in people. Each feature is downloaded when it is first opened. */
export const frameRoutes: Routes = [
  {
    path: '',
    component: Frame,
    // The tray sends what waits from whichever page is opened first.
    providers: [provideIcons(), provideEnvironmentInitializer(() => inject(WaitingTray))],
    children: [
      {
        path: '',
        pathMatch: 'full',
        title: 'Bench',
        loadComponent: async () => (await import('../bench/bench')).BenchPage,
      },
      { path: 'cars', loadChildren: async () => (await import('../cars/cars.routes')).carsRoutes },
      {
        path: 'specs',
        canActivate: [needs('specs.read')],
        loadChildren: async () => (await import('../spec-book/spec-book.routes')).specBookRoutes,
      },
      { path: 'sheets', loadChildren: async () => (await import('../sheets/sheets.routes')).sheetsRoutes },
      {
        path: 'workings',
        loadChildren: async () => (await import('../workings/workings.routes')).workingsRoutes,
      },
      {
        path: 'account',
        title: 'Account',
        loadComponent: async () => (await import('../account/account')).AccountPage,
      },
      {
        path: '**',
        title: 'Not found',
        loadComponent: async () => (await import('../not-found/not-found')).NotFoundPage,
      },
    ],
  },
];
