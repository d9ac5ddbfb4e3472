import type { Routes } from '@angular/router';

export const carsRoutes: Routes = [
  { path: '', title: 'Car files', loadComponent: async () => (await import('./list/car-list')).CarList },
  { path: ':id', title: 'Car file', loadComponent: async () => (await import('./file/car-page')).CarPage },
];
