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
    ],
  },
];
