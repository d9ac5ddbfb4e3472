import { TestBed } from '@angular/core/testing';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Light } from './light';

const deviceIsDark = (dark: boolean): void => {
  vi.stubGlobal('matchMedia', (query: string) => ({
    matches: dark && query === '(prefers-color-scheme: dark)',
  }));
};

describe('the light', () => {
  afterEach(() => {
    localStorage.clear();
    vi.unstubAllGlobals();
  });

  const light = (): Light => {
    const service = TestBed.inject(Light);
    service.follow();
    return service;
  };

  it('follows the device on the first visit', () => {
    deviceIsDark(true);
    light();
    expect(document.body.dataset['light']).toBe('lamp');
  });

  it('is the person’s choice from then on, whatever the device', () => {
    deviceIsDark(true);
    light().choose('day');
    TestBed.resetTestingModule();

    expect(light().light()).toBe('day');
    expect(document.body.dataset['light']).toBe('day');
  });

  it('prints by day and is back as it was', () => {
    deviceIsDark(true);
    light();
    dispatchEvent(new Event('beforeprint'));
    expect(document.body.dataset['light']).toBe('day');
    dispatchEvent(new Event('afterprint'));
    expect(document.body.dataset['light']).toBe('lamp');
  });
});
