import { HttpClient, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { expect, it } from 'vitest';
import { allPages } from './all-pages';

it('reads page after page by the cursor of the one before', () => {
  TestBed.configureTestingModule({ providers: [provideHttpClient(), provideHttpClientTesting()] });
  const api = TestBed.inject(HttpTestingController);
  const answers: (readonly string[])[] = [];
  allPages<string>(TestBed.inject(HttpClient), '/api/cars').subscribe((all) => answers.push(all));

  api.expectOne('/api/cars?limit=200').flush({ items: ['one', 'two'], next: 'c2' });
  api.expectOne('/api/cars?limit=200&cursor=c2').flush({ items: ['three'], next: null });

  expect(answers).toEqual([['one', 'two', 'three']]);
  api.verify();
});
