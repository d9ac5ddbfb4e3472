import type { Routes } from '@angular/router';

export const sheetsRoutes: Routes = [];
