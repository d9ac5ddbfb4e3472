import type { Routes } from '@angular/router';

export const specBookRoutes: Routes = [
  { path: '', title: 'Spec book', loadComponent: async () => (await import('./list/spec-list')).SpecList },
  {
    path: ':id/:edition',
    pathMatch: 'full',
    redirectTo: ':id/:edition/engine',
  },
  {
    path: ':id/:edition/:section',
    title: 'Spec',
    loadComponent: async () => (await import('./edition/edition-page')).EditionPage,
  },
];
