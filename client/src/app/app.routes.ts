import type { Routes } from '@angular/router';
import { signedIn } from './session/signed-in';

export const routes: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in',
    loadComponent: async () => (await import('./sign-in/sign-in')).SignIn,
  },
  {
    path: 'v/:code',
    title: 'Check a build sheet',
    loadComponent: async () => (await import('./verification/verification')).VerificationPage,
  },
  {
    path: '',
    canActivate: [signedIn],
    loadChildren: async () => (await import('./layout/frame.routes')).frameRoutes,
  },
];
