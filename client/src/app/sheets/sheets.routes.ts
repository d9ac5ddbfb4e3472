import type { Routes } from '@angular/router';

export const sheetsRoutes: Routes = [
  { path: '', title: 'Sheets', loadComponent: async () => (await import('./list/sheet-list')).SheetList },
];
