import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { beforeEach, describe, expect, it } from 'vitest';
import { PageFailed } from './page-failed';

@Component({ selector: 'ss-any', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Any {}

describe('a page that could not be downloaded', () => {
  let isDown: boolean;
  let fixture: ComponentFixture<PageFailed>;
  let router: Router;

  beforeEach(async () => {
    isDown = true;
    TestBed.configureTestingModule({
      providers: [
        provideRouter([
          { path: '', pathMatch: 'full', component: Any },
          {
            path: 'cars',
            loadComponent: () =>
              isDown ? Promise.reject(new TypeError('Failed to fetch')) : Promise.resolve(Any),
          },
        ]),
      ],
    });
    router = TestBed.inject(Router);
    fixture = TestBed.createComponent(PageFailed);
    await router.navigateByUrl('/');
  });

  const words = async (): Promise<string> => {
    await fixture.whenStable();
    return (fixture.nativeElement as HTMLElement).textContent.trim();
  };
  const tryAgain = (): void => (fixture.nativeElement as HTMLElement).querySelector('button')!.click();

  it('is told of, and opened by another try', async () => {
    expect(await words()).toBe('');
    await expect(router.navigateByUrl('/cars')).rejects.toThrow('Failed to fetch');
    expect(await words()).toContain('The page could not be opened');

    tryAgain();
    expect(await words()).toContain('The page could not be opened');

    isDown = false;
    tryAgain();
    await expect.poll(() => router.url).toBe('/cars');
    expect(await words()).toBe('');
  });
});
