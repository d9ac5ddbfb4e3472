import type { Routes } from '@angular/router';

export const wiringRoutes: Routes = [];
