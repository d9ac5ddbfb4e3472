import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { ApiProblem } from './api-problem';
import { Network } from './network';
import { problemErrors } from './problem-errors';

describe('problem errors', () => {
  let http: HttpClient;
  let api: HttpTestingController;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(withInterceptors([problemErrors])), provideHttpClientTesting()],
    });
    http = TestBed.inject(HttpClient);
    api = TestBed.inject(HttpTestingController);
  });

  const failing = (): { problem: () => ApiProblem } => {
    let caught: unknown;
    http.get('/api/cars').subscribe({ error: (error: unknown) => (caught = error) });
    return {
      problem: () => {
        if (caught instanceof ApiProblem) return caught;
        throw new Error('No ApiProblem was thrown.');
      },
    };
  };

  // Problem Details as RFC 9457, section 3.1 gives its members.
  it('carries title, detail and the fields of Problem Details', () => {
    const { problem } = failing();
    api.expectOne('/api/cars').flush(
      {
        type: 'about:blank',
        title: 'This can’t be taken',
        status: 400,
        detail: 'Two fields are wrong.',
        errors: [{ field: 'name', message: 'Write a name.' }],
      },
      { status: 400, statusText: 'Bad Request' },
    );

    expect(problem().status).toBe(400);
    expect(problem().sentence).toBe('Two fields are wrong.');
    expect(problem().errorAt('name')).toBe('Write a name.');
    expect(problem().errorAt('year')).toBeNull();
  });

  it('makes a sentence of a bare status', () => {
    const { problem } = failing();
    api.expectOne('/api/cars').flush('<html></html>', { status: 404, statusText: 'Not Found' });

    expect(problem().sentence).toBe('There is nothing here, or it isn’t yours to see.');
  });

  it('tells an unreachable server from a wrong answer, and notes it until something is answered', () => {
    const { problem } = failing();
    api.expectOne('/api/cars').error(new ProgressEvent('error'));

    expect(problem().noNetwork).toBe(true);
    expect(TestBed.inject(Network).reachable()).toBe(false);

    http.get('/api/cars').subscribe();
    api.expectOne('/api/cars').flush([]);
    expect(TestBed.inject(Network).reachable()).toBe(true);
  });
});
