import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { problemErrors } from '../http/problem-errors';
import { sessionOf } from '../session/testing/sessions';
import { SignIn } from './sign-in';

@Component({ changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class Blank {}

describe('the sign-in page', () => {
  let fixture: ComponentFixture<SignIn>;
  let page: HTMLElement;
  let api: HttpTestingController;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problemErrors])),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', component: Blank }]),
      ],
    });
    api = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(SignIn);
    fixture.componentRef.setInput('to', '/sheets');
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  afterEach(() => localStorage.clear());

  const signIn = async (email: string, password: string): Promise<void> => {
    const [emailField, passwordField] = page.querySelectorAll('input');
    emailField!.value = email;
    passwordField!.value = password;
    for (const field of [emailField!, passwordField!]) field.dispatchEvent(new Event('input'));
    page.querySelector('form')!.dispatchEvent(new Event('submit', { cancelable: true }));
    await fixture.whenStable();
  };

  it('goes on to where the person wanted to go', async () => {
    await signIn('tomasz@lowmill.example', 'a password');
    api.expectOne('/api/session').flush(sessionOf('builder'));

    await vi.waitUntil(() => TestBed.inject(Router).url === '/sheets');
  });

  it('says at the field what is missing, and asks nothing of the api', async () => {
    await signIn('tomasz', '');

    expect(page.querySelector('#email-error')?.textContent).toContain('e-mail address');
    expect(page.querySelector('#password-error')?.textContent).toContain('password');
    api.expectNone('/api/session');
  });

  it('says what the api said, and keeps what was typed', async () => {
    await signIn('tomasz@lowmill.example', 'wrong');
    api
      .expectOne('/api/session')
      .flush(
        { type: 'about:blank', title: 'Unauthorized', status: 401, detail: 'They don’t belong together.' },
        { status: 401, statusText: 'Unauthorized' },
      );
    await fixture.whenStable();

    expect(page.querySelector('[role=alert]')?.textContent).toContain('They don’t belong together.');
    expect(page.querySelector<HTMLInputElement>('#email')?.value).toBe('tomasz@lowmill.example');
  });
});
