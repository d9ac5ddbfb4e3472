import { inject } from '@angular/core';
import { Router, type CanActivateFn } from '@angular/router';
import type { Permission } from '@second-spanner/shared/contracts/permissions';
import { map } from 'rxjs';
import { SessionStore } from './session-store';

/** Lets signed-in people through; others sign in first and come back. */
export const signedIn: CanActivateFn = (_route, state) => {
  const sessions = inject(SessionStore);
  const router = inject(Router);
  if (sessions.person() !== null) return true;

  const signIn = router.createUrlTree(['/sign-in'], { queryParams: { to: state.url } });
  if (sessions.session() === null) return signIn;
  return sessions.load().pipe(map((session) => (session === null ? signIn : true)));
};

/** Lets through who may do this; others see their bench. */
export function needs(permission: Permission): CanActivateFn {
  return () => inject(SessionStore).may(permission) || inject(Router).createUrlTree(['/']);
}
