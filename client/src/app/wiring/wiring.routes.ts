import type { Routes } from '@angular/router';
import { needs } from '../session/signed-in';

export const wiringRoutes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'wiring' },
  {
    path: 'wiring',
    title: 'Wiring map',
    canActivate: [needs('calculate')],
    loadComponent: async () => (await import('./wiring')).WiringPage,
  },
];
