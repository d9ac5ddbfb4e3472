import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { listAddress } from './list-address';

@Component({ selector: 'ss-test-list', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class List {
  readonly address = listAddress('cars');
}

@Component({ changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class Elsewhere {}

describe('a list’s address', () => {
  let harness: RouterTestingHarness;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        provideRouter([
          { path: 'cars', component: List },
          { path: 'elsewhere', component: Elsewhere },
        ]),
      ],
    });
    harness = await RouterTestingHarness.create();
  });

  it('holds what is looked for and the order', async () => {
    const list = await harness.navigateByUrl('/cars?q=tern', List);
    list.address.set({ sort: '-year' });
    await harness.fixture.whenStable();

    expect(TestBed.inject(Router).url).toBe('/cars?q=tern&sort=-year');
  });

  it('is where it was left when the list is opened again without any', async () => {
    await harness.navigateByUrl('/cars?q=tern&page=2', List);
    await harness.navigateByUrl('/elsewhere');
    await harness.navigateByUrl('/cars', List);
    await harness.fixture.whenStable();

    expect(TestBed.inject(Router).url).toBe('/cars?q=tern&page=2');
  });
});
