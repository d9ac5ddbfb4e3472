import { signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { ApiProblem } from '../http/api-problem';
import { LoadState } from './load-state';

describe('what stands in place of a thing that is being read', () => {
  const isLoading = signal(true);
  const error = signal<Error | undefined>(undefined);
  const value = signal<string | undefined>(undefined);
  let reloads: number;
  let fixture: ComponentFixture<LoadState>;

  beforeEach(async () => {
    isLoading.set(true);
    error.set(undefined);
    value.set(undefined);
    reloads = 0;
    fixture = TestBed.createComponent(LoadState);
    fixture.componentRef.setInput('what', 'the car files');
    fixture.componentRef.setInput('from', {
      isLoading,
      error,
      hasValue: () => value() !== undefined,
      reload: () => {
        reloads += 1;
        return true;
      },
    });
    await fixture.whenStable();
  });

  const words = async (): Promise<string> => {
    await fixture.whenStable();
    return (fixture.nativeElement as HTMLElement).textContent.trim();
  };

  it('says what is being read', async () => {
    expect(await words()).toBe('Reading the car files…');
  });

  it('says what went wrong and tries again', async () => {
    error.set(new ApiProblem(500, 'The shop’s server could not answer.'));
    isLoading.set(false);
    expect(await words()).toContain('Could not read the car files');

    (fixture.nativeElement as HTMLElement).querySelector('button')!.click();
    expect(reloads).toBe(1);
  });

  it('tells no network from an error', async () => {
    error.set(new ApiProblem(0, 'The shop’s server can’t be reached.'));
    expect(await words()).toMatch(/^No network/);
  });

  it('is nothing once there is something to show', async () => {
    value.set('three cars');
    isLoading.set(false);
    expect(await words()).toBe('');
  });
});
