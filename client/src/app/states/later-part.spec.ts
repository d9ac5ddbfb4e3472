import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { laterPart, type LoadPart } from './later-part';
import { LoadState } from './load-state';

@Component({ selector: 'ss-pulls', template: 'Nut 5', changeDetection: ChangeDetectionStrategy.OnPush })
class Pulls {}

@Component({ selector: 'ss-leads', template: 'Lead 3', changeDetection: ChangeDetectionStrategy.OnPush })
class Leads {}

const wanted = signal<LoadPart | undefined>(undefined);

@Component({
  selector: 'ss-any-page',
  imports: [LoadState, NgComponentOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (part.hasValue()) {
      <ng-container [ngComponentOutlet]="part.value()" />
    } @else {
      <ss-load-state what="the work" [from]="part" />
    }
  `,
})
class AnyPage {
  protected readonly part = laterPart(wanted);
}

describe('a part of a page that is loaded when it is shown', () => {
  let fixture: ComponentFixture<AnyPage>;
  const words = async (): Promise<string> => {
    await fixture.whenStable();
    return (fixture.nativeElement as HTMLElement).textContent.trim();
  };

  beforeEach(() => {
    wanted.set(undefined);
    fixture = TestBed.createComponent(AnyPage);
  });

  it('is not there, and says nothing, before it is wanted', async () => {
    expect(await words()).toBe('');
  });

  it('says that it comes, and comes', async () => {
    let arrive: () => void = () => undefined;
    const arrival = new Promise<void>((resolve) => {
      arrive = resolve;
    });
    wanted.set(() => arrival.then(() => Pulls));
    fixture.detectChanges();
    expect((fixture.nativeElement as HTMLElement).textContent.trim()).toBe('Reading the work…');
    arrive();
    expect(await words()).toBe('Nut 5');
  });

  it('says that it could not be loaded, and is loaded by another try', async () => {
    let isDown = true;
    wanted.set(() => (isDown ? Promise.reject(new TypeError('Failed to fetch')) : Promise.resolve(Pulls)));
    expect(await words()).toContain('This part of the page has not been opened on this device before.');

    isDown = false;
    (fixture.nativeElement as HTMLElement).querySelector('button')!.click();
    expect(await words()).toBe('Nut 5');
  });

  it('never shows one part in the place of another', async () => {
    wanted.set(() => Promise.resolve(Pulls));
    expect(await words()).toBe('Nut 5');
    wanted.set(() => Promise.resolve(Leads));
    fixture.detectChanges();
    expect((fixture.nativeElement as HTMLElement).textContent).not.toContain('Nut 5');
    expect(await words()).toBe('Lead 3');
  });
});
