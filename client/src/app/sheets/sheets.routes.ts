import type { Routes } from '@angular/router';

/** All sheets, and each sheet with its steps. */
export const sheetsRoutes: Routes = [
  { path: '', title: 'Sheets', loadComponent: async () => (await import('./list/sheet-list')).SheetList },
  {
    path: ':id',
    title: 'Assembly sheet',
    loadComponent: async () => (await import('./sheet/sheet-shell')).SheetShell,
    children: [
      { path: '', loadComponent: async () => (await import('./sheet/sheet-start')).SheetStart },
      { path: 'steps/:code', loadComponent: async () => (await import('./step/step-page')).StepPage },
      {
        path: 'steps/:code/second',
        loadComponent: async () => (await import('./second/second-page')).SecondPage,
      },
      { path: 'history', loadComponent: async () => (await import('./history/history-page')).HistoryPage },
      { path: 'snags', loadComponent: async () => (await import('./snags/snags-page')).SnagsPage },
      {
        path: 'sign-off',
        loadComponent: async () => (await import('./sign-off/sign-off-page')).SignOffPage,
      },
    ],
  },
];
