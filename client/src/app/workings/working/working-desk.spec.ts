import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { provideIcons } from '../../layout/icons';
import { SessionStore } from '../../session/session-store';
import { sessionOf } from '../../session/testing/sessions';
import { workingsRoutes } from '../workings.routes';

describe('a working’s page', () => {
  let harness: RouterTestingHarness;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideIcons(),
        provideRouter([{ path: 'workings', children: workingsRoutes }], withComponentInputBinding()),
      ],
    });
    TestBed.inject(SessionStore).load().subscribe();
    TestBed.inject(HttpTestingController).expectOne('/api/session').flush(sessionOf('car-owner'));
    harness = await RouterTestingHarness.create();
    page = harness.routeNativeElement ?? document.body;
  });

  const open = async (address: string): Promise<void> => {
    await harness.navigateByUrl(address);
    page = harness.routeNativeElement!;
    await expect.poll(() => page.querySelector('ss-working-desk')).not.toBeNull();
    await harness.fixture.whenStable();
  };
  const field = (): HTMLInputElement => page.querySelector('.fields input')!;
  const type = async (text: string): Promise<void> => {
    field().value = text;
    field().dispatchEvent(new Event('input'));
    await harness.fixture.whenStable();
  };
  const press = async (words: string): Promise<void> => {
    [...page.querySelectorAll('button')].find((button) => button.textContent.trim() === words)!.click();
    await harness.fixture.whenStable();
  };
  const words = (selector: string): string => page.querySelector(selector)?.textContent ?? '';

  it('opens with the case of its address', async () => {
    await open('/workings/convert/convert?figure=27%20lbf%C2%B7ft&other=1');
    expect(field().value).toBe('27 lbf·ft');
    // NIST SP 811 (2008), appendix B.8: 1 lbf·ft is 1.355 818 N·m.
    expect(words('.middle')).toContain('36.6');
  });

  it('answers as one types, and writes the case into the address', async () => {
    await open('/workings/convert/convert');
    expect(words('.judged')).toContain('Still to be filled in: figure with its unit.');
    await type('1 in');
    // Exact by definition: an inch is 25.4 mm.
    expect(words('.middle')).toContain('25.4');
    await expect.poll(() => TestBed.inject(Router).url).toBe('/workings/convert/convert?figure=1%20in');
  });

  it('says what is wrong at the field, keeps it, and answers nothing', async () => {
    await open('/workings/convert/convert');
    await type('27 furlongs');
    expect(words('.fields .error')).toContain('There is no unit “furlongs”');
    expect(field().value).toBe('27 furlongs');
    expect(words('.judged')).toContain('Put right what is marked');
  });

  it('shows fields that the case asks for, and hides them again', async () => {
    await open('/workings/convert/convert');
    expect(page.querySelectorAll('.fields select')).toHaveLength(0);
    await type('82 °C');
    expect(page.querySelectorAll('.fields select')).toHaveLength(1);
    await type('82 mm');
    expect(page.querySelectorAll('.fields select')).toHaveLength(0);
  });

  it('fills in the example with its source, and begins again', async () => {
    await open('/workings/convert/convert');
    expect(words('ss-working-start')).toContain('NIST SP 811');
    await press('Try the example');
    expect(field().value).toBe('27 lbf·ft');
    await press('Begin again, empty');
    expect(field().value).toBe('');
  });

  it('says what its case was begun from, also to a changed case, until it is begun again', async () => {
    await open('/workings/convert/convert?figure=1%20in&of=AT18%2C%20edition%202%3A%20Head%20nuts');
    expect(words('ss-title-block')).toContain('AT18, edition 2: Head nuts');
    await type('2 in');
    expect(words('ss-title-block')).toContain('AT18, edition 2: Head nuts');
    await press('Begin again, empty');
    expect(words('ss-title-block')).not.toContain('AT18');
  });

  it('opens a kept case with its name and a link to its car', async () => {
    const api = TestBed.inject(HttpTestingController);
    const reply = async (url: string, body: object): Promise<void> =>
      expect
        .poll(() => {
          const [request] = api.match(url);
          request?.flush(body);
          return request;
        })
        .toBeDefined();
    const opened = open('/workings/convert/convert?figure=1%20in&kept=c1,k1');
    await reply('/api/cars/c1', { id: 'c1', name: 'Aldwyn Tern 1.8' });
    await reply('/api/cars/c1/workings', { items: [{ id: 'k1', title: 'Sump, an inch' }] });
    await opened;
    expect(words('ss-title-block')).toContain('Sump, an inch');
    expect(page.querySelector('ss-title-block ss-cell a')?.getAttribute('href')).toBe('/cars/c1');
    await type('2 in');
    await expect.poll(() => words('ss-title-block')).not.toContain('Sump, an inch');
  });

  it('is opened by its group’s address, which keeps the case', async () => {
    await open('/workings/convert?figure=1%20mm');
    expect(TestBed.inject(Router).url).toBe('/workings/convert/convert?figure=1%20mm');
    expect(field().value).toBe('1 mm');
  });
});
