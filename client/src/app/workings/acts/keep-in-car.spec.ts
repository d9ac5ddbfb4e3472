import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { beforeEach, describe, expect, it } from 'vitest';
import { KeepInCar } from './keep-in-car';

const car = { id: 'c1', code: 'LM-C01', name: 'Aldwyn Tern 1.8' };

describe('keeping a working in a car file', () => {
  let fixture: ComponentFixture<KeepInCar>;
  let api: HttpTestingController;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
    });
    api = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(KeepInCar);
    fixture.componentRef.setInput('working', 'convert');
    fixture.componentRef.setInput('title', 'Convert a figure');
    fixture.componentRef.setInput('typed', { figure: '27 lbf·ft' });
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  const press = (words: string): void => {
    [...page.querySelectorAll('button')].find((button) => button.textContent.trim() === words)!.click();
    TestBed.tick();
  };
  const open = async (): Promise<void> => {
    press('Keep in a car file');
    await expect.poll(() => page.querySelector('dialog')?.open).toBe(true);
    api.expectOne('/api/cars?limit=200').flush({ items: [car], next: null });
    await fixture.whenStable();
  };
  const choose = async (id: string): Promise<void> => {
    const select = page.querySelector('select')!;
    select.value = id;
    select.dispatchEvent(new Event('change'));
    await fixture.whenStable();
  };

  it('asks nothing of the api until it is opened', () => {
    api.verify();
  });

  it('wants a car, and keeps nothing without one', async () => {
    await open();
    press('Keep it');
    expect(page.textContent).toContain('Choose the car that it is kept with.');
    api.verify();
  });

  it('keeps what was typed under a name, and says where', async () => {
    await open();
    await choose('c1');
    press('Keep it');
    const request = api.expectOne({ method: 'POST', url: '/api/cars/c1/workings' });
    expect(request.request.body).toEqual({
      working: 'convert',
      title: 'Convert a figure',
      typed: { figure: '27 lbf·ft' },
    });
    request.flush({ id: 'k1', carId: 'c1' });
    await expect.poll(() => page.querySelector('a')?.getAttribute('href')).toBe('/cars/c1');
    expect(page.querySelector('dialog')).toBeNull();
  });

  it('is left without keeping anything, and opened anew', async () => {
    await open();
    press('Not now');
    expect(page.querySelector('dialog')).toBeNull();
    await open();
    expect(page.querySelector('dialog')?.open).toBe(true);
    api.verify();
  });

  it('says why it was not kept, and stays open', async () => {
    await open();
    await choose('c1');
    press('Keep it');
    api
      .expectOne('/api/cars/c1/workings')
      .flush({ title: 'Not yours', detail: 'This isn’t yours to keep.' }, { status: 403, statusText: '' });
    await expect.poll(() => page.querySelector('dialog')?.textContent).toContain('This isn’t yours to keep.');
    expect(page.querySelector('dialog')?.open).toBe(true);
  });
});
