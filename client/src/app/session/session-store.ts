import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { Router } from '@angular/router';
import type { Dialect, Session, SignInRequest } from '@second-spanner/shared/contracts/people';
import { may, type Permission } from '@second-spanner/shared/contracts/permissions';
import {
  catchError,
  finalize,
  map,
  of,
  shareReplay,
  switchMap,
  tap,
  throwError,
  type Observable,
} from 'rxjs';
import { ApiProblem } from '../http/api-problem';
import { withoutRenewal } from '../http/without-renewal';
import { forgetDrafts } from '../remembered/kept-drafts';
import { recall, remember } from '../remembered/remembered';
import { oneWindowAtOnce } from './in-turn';

const remembered = 'session';

/** Who is signed in. Undefined until asked, null when nobody is. */
@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly known = signal<Session | null | undefined>(undefined);
  private renewing: Observable<Session> | null = null;

  readonly session = this.known.asReadonly();
  readonly person = computed(() => this.known()?.person ?? null);
  readonly shop = computed(() => this.known()?.shop ?? null);
  /** The person's own trade words, else the shop's. */
  readonly dialect = computed<Dialect>(() => this.person()?.dialect ?? this.shop()?.dialect ?? 'british');

  /** Whether the signed-in person's role may do this at all. */
  may(permission: Permission): boolean {
    const person = this.person();
    return person !== null && may(person.role, permission);
  }

  /** Who is signed in, by the api; without a network, who last was on this device. */
  load(): Observable<Session | null> {
    return this.http.get<Session>('/api/session').pipe(
      catchError((error: unknown) => {
        if (!(error instanceof ApiProblem)) return throwError(() => error);
        if (error.noNetwork) return of(lastSession());
        return error.status === 401 ? of(null) : throwError(() => error);
      }),
      tap((session) => this.keep(session)),
    );
  }

  signIn(request: SignInRequest): Observable<Session> {
    return this.http.post<Session>('/api/session', request).pipe(tap((session) => this.keep(session)));
  }

  signOut(): Observable<void> {
    return this.http.delete('/api/session').pipe(
      map(() => undefined),
      tap(() => {
        forgetDrafts();
        this.keep(null);
      }),
    );
  }

  /**
   * Renews the session; requests that fail together share one renewal. Windows take turns: two that send the same
   * renewal token would end the session, as a token that was stolen does.
   */
  renew(): Observable<Session> {
    const alone = () => this.http.post<Session>('/api/session/renewal', {});
    const inTurn = () =>
      this.renewedElsewhere().pipe(switchMap((session) => (session ? of(session) : alone())));
    this.renewing ??= oneWindowAtOnce('second-spanner.renewal', { alone, inTurn }).pipe(
      tap((session) => this.keep(session)),
      finalize(() => (this.renewing = null)),
      shareReplay(1),
    );
    return this.renewing;
  }

  prefer(dialect: Dialect | null): Observable<Session> {
    return this.http.put<Session>('/api/preferences', { dialect }).pipe(tap((session) => this.keep(session)));
  }

  /** The session is over: on to the sign-in page, and back here afterwards. */
  ended(): void {
    if (this.known() === null) return;
    this.keep(null);
    void this.router.navigate(['/sign-in'], { queryParams: { to: this.router.url } });
  }

  /** The session if another window has renewed it meanwhile. */
  private renewedElsewhere(): Observable<Session | null> {
    return this.http
      .get<Session>('/api/session', { context: withoutRenewal() })
      .pipe(
        catchError((error: unknown) =>
          error instanceof ApiProblem && error.status === 401 ? of(null) : throwError(() => error),
        ),
      );
  }

  private keep(session: Session | null): void {
    this.known.set(session);
    remember(remembered, session === null ? null : JSON.stringify(session));
  }
}

function lastSession(): Session | null {
  const text = recall(remembered);
  return text === null ? null : (JSON.parse(text) as Session);
}
