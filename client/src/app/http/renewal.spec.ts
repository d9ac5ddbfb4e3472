import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { SessionStore } from '../session/session-store';
import { sessionOf } from '../session/testing/sessions';
import { problemErrors } from './problem-errors';
import { renewal } from './renewal';

@Component({ changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class Blank {}

const refused = { status: 401, statusText: 'Unauthorized' };

describe('the renewal of a session', () => {
  let http: HttpClient;
  let api: HttpTestingController;
  let answers: unknown[];

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([renewal, problemErrors])),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', component: Blank }]),
      ],
    });
    http = TestBed.inject(HttpClient);
    api = TestBed.inject(HttpTestingController);
    answers = [];
    TestBed.inject(SessionStore)
      .signIn({ email: 'tomasz@lowmill.example', password: 'a password' })
      .subscribe();
    api.expectOne('/api/session').flush(sessionOf('builder'));
  });

  afterEach(() => {
    api.verify();
    localStorage.clear();
  });

  const ask = (url: string): void => {
    http.get(url).subscribe({
      next: (answer) => answers.push(answer),
      error: (error: unknown) => answers.push(error),
    });
  };

  it('renews once and sends the request again', () => {
    ask('/api/bench');
    api.expectOne('/api/bench').flush(null, refused);
    api.expectOne('/api/session/renewal').flush(sessionOf('builder'));
    api.expectOne('/api/bench').flush({ items: [] });

    expect(answers).toEqual([{ items: [] }]);
  });

  it('shares one renewal among requests that fail together', () => {
    ask('/api/bench');
    ask('/api/cars');
    api.expectOne('/api/bench').flush(null, refused);
    api.expectOne('/api/cars').flush(null, refused);
    api.expectOne('/api/session/renewal').flush(sessionOf('builder'));
    api.expectOne('/api/bench').flush('bench');
    api.expectOne('/api/cars').flush('cars');

    expect(answers).toEqual(['bench', 'cars']);
  });

  it('does not renew a second time for the same request', () => {
    ask('/api/bench');
    api.expectOne('/api/bench').flush(null, refused);
    api.expectOne('/api/session/renewal').flush(sessionOf('builder'));
    api.expectOne('/api/bench').flush(null, refused);

    expect(answers).toMatchObject([{ status: 401 }]);
  });

  it('goes to the sign-in page, with the way back, when the session is over', async () => {
    const router = TestBed.inject(Router);
    await router.navigateByUrl('/sheets/one?from=two');

    ask('/api/bench');
    api.expectOne('/api/bench').flush(null, refused);
    api.expectOne('/api/session/renewal').flush(null, refused);
    await vi.waitUntil(() => router.url.startsWith('/sign-in'));

    expect(router.url).toBe('/sign-in?to=%2Fsheets%2Fone%3Ffrom%3Dtwo');
    expect(TestBed.inject(SessionStore).person()).toBeNull();
  });

  it('keeps the session when only the network fails', () => {
    ask('/api/bench');
    api.expectOne('/api/bench').flush(null, refused);
    api.expectOne('/api/session/renewal').error(new ProgressEvent('error'));

    expect(answers).toMatchObject([{ status: 0 }]);
    expect(TestBed.inject(SessionStore).person()).not.toBeNull();
  });

  describe('where windows take turns', () => {
    beforeEach(() => {
      const locks = { request: (_name: string, task: () => Promise<unknown>) => task() };
      Object.defineProperty(navigator, 'locks', { value: locks, configurable: true });
    });
    afterEach(() => Reflect.deleteProperty(navigator, 'locks'));

    const next = (url: string) => vi.waitFor(() => api.expectOne(url));

    it('takes what another window has renewed meanwhile', async () => {
      ask('/api/bench');
      api.expectOne('/api/bench').flush(null, refused);
      (await next('/api/session')).flush(sessionOf('builder'));
      (await next('/api/bench')).flush('bench');

      expect(answers).toEqual(['bench']);
    });

    it('renews when its turn has come and no other window has', async () => {
      ask('/api/bench');
      api.expectOne('/api/bench').flush(null, refused);
      (await next('/api/session')).flush(null, refused);
      (await next('/api/session/renewal')).flush(sessionOf('builder'));
      (await next('/api/bench')).flush('bench');

      expect(answers).toEqual(['bench']);
    });
  });

  it('takes a wrong password for what it is', () => {
    http.post('/api/session', {}).subscribe({ error: (error: unknown) => answers.push(error) });
    api.expectOne('/api/session').flush(null, refused);

    expect(answers).toMatchObject([{ status: 401 }]);
  });
});
