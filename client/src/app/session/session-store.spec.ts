import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { problemErrors } from '../http/problem-errors';
import { SessionStore } from './session-store';
import { sessionOf } from './testing/sessions';

describe('the session store', () => {
  let sessions: SessionStore;
  let api: HttpTestingController;

  beforeEach(() => {
    localStorage.clear();
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problemErrors])),
        provideHttpClientTesting(),
        provideRouter([]),
      ],
    });
    sessions = TestBed.inject(SessionStore);
    api = TestBed.inject(HttpTestingController);
  });

  afterEach(() => localStorage.clear());

  const load = (): void => {
    sessions.load().subscribe();
  };

  it('knows who is signed in and what they may do', () => {
    load();
    api.expectOne('/api/session').flush(sessionOf('builder'));

    expect(sessions.may('entries.record')).toBe(true);
    expect(sessions.may('sheets.release')).toBe(false);
  });

  it('lets nobody do anything while nobody is signed in', () => {
    load();
    api.expectOne('/api/session').flush(null, { status: 401, statusText: 'Unauthorized' });

    expect(sessions.session()).toBeNull();
    expect(sessions.may('cars.read')).toBe(false);
  });

  it('works for who last was here when there is no network', () => {
    load();
    api.expectOne('/api/session').flush(sessionOf('builder'));
    load();
    api.expectOne('/api/session').error(new ProgressEvent('error'));

    expect(sessions.person()?.name).toBe('Tomasz Brandt');
  });

  it('forgets the person on signing out', () => {
    load();
    api.expectOne('/api/session').flush(sessionOf('builder'));
    sessionStorage.setItem('second-spanner.draft.a-person/sheet/8.6', '{}');
    sessions.signOut().subscribe();
    api.expectOne({ method: 'DELETE', url: '/api/session' }).flush(null);
    load();
    api.expectOne('/api/session').error(new ProgressEvent('error'));

    expect(sessions.person()).toBeNull();
    expect(sessionStorage).toHaveLength(0);
  });

  it('takes the person’s trade words before the shop’s', () => {
    load();
    api.expectOne('/api/session').flush(sessionOf('builder'));
    expect(sessions.dialect()).toBe('british');

    sessions.prefer('american').subscribe();
    const request = api.expectOne('/api/preferences');
    request.flush(sessionOf('builder', 'american'));

    expect(request.request.body).toEqual({ dialect: 'american' });
    expect(sessions.dialect()).toBe('american');
  });
});
