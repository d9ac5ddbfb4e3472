import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { expect, it } from 'vitest';
import { SessionStore } from '../session/session-store';
import { sessionOf } from '../session/testing/sessions';
import { TradeWords } from './trade-words';

@Component({
  imports: [TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `{{ '{Sump} bolts and the {end float}' | tradeWords }}`,
})
class Page {}

// The pairs sump/oil pan and end float/end play: common practice, no source.
it('sets trade words in the person’s dialect, and again when they change it', async () => {
  TestBed.configureTestingModule({
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
  });
  const api = TestBed.inject(HttpTestingController);
  const fixture = TestBed.createComponent(Page);
  const page = fixture.nativeElement as HTMLElement;
  await fixture.whenStable();
  expect(page.textContent).toBe('Sump bolts and the end float');

  TestBed.inject(SessionStore).prefer('american').subscribe();
  api.expectOne('/api/preferences').flush(sessionOf('builder', 'american'));
  await fixture.whenStable();
  expect(page.textContent).toBe('Oil pan bolts and the end play');
});
