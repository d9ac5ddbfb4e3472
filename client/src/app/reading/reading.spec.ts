import { ChangeDetectionStrategy, Component, signal, viewChild } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideHttpClient } from '@angular/common/http';
import { provideRouter } from '@angular/router';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import { beforeEach, describe, expect, it } from 'vitest';
import { provideIcons } from '../layout/icons';
import { OwnKeypad } from './own-keypad';
import { Reading } from './reading';

@Component({
  imports: [Reading],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<ss-reading
    label="Reading, nut 6"
    [units]="units"
    [(unit)]="unit"
    [(text)]="text"
    [error]="error()"
  />`,
})
class Page {
  readonly units: readonly Unit[] = ['N·m', 'lbf·ft'];
  readonly unit = signal<Unit>('N·m');
  readonly text = signal('');
  readonly error = signal<string | null>(null);
  readonly reading = viewChild.required(Reading);
}

describe('the reading field', () => {
  let fixture: ComponentFixture<Page>;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideRouter([]), provideIcons()],
    });
    fixture = TestBed.createComponent(Page);
    page = fixture.nativeElement as HTMLElement;
    document.body.append(page);
    await fixture.whenStable();
  });

  const field = (): HTMLInputElement => page.querySelector('input')!;
  const keypad = (): Element | null => page.querySelector('ss-keypad');
  const press = async (...names: string[]): Promise<void> => {
    for (const name of names) {
      const keys = [...page.querySelectorAll<HTMLButtonElement>('ss-keypad .keys button')];
      keys.find((key) => key.getAttribute('aria-label') === name)!.click();
      await fixture.whenStable();
    }
  };
  const useOwnKeypad = async (): Promise<void> => {
    TestBed.inject(OwnKeypad).choose(true);
    field().focus();
    await fixture.whenStable();
  };

  it('types by its own keypad and reads the figure in its unit', async () => {
    await useOwnKeypad();
    await press('5', '5', 'Point', '4', '1', 'Rub out');

    expect(field().value).toBe('55.4');
    expect(fixture.componentInstance.text()).toBe('55.4');
    expect(fixture.componentInstance.reading().quantity()).toEqual({ value: 55.4, unit: 'N·m' });
  });

  it('keeps the device’s keys away while its own keypad is up, and lets the person choose', async () => {
    await useOwnKeypad();
    expect(field().getAttribute('inputmode')).toBe('none');
    expect(keypad()).not.toBeNull();

    TestBed.inject(OwnKeypad).choose(false);
    await fixture.whenStable();
    expect(field().getAttribute('inputmode')).toBe('decimal');
    expect(keypad()).toBeNull();
  });

  it('shows its own error only after typing, and keeps what was typed', async () => {
    field().focus();
    field().value = '5..';
    field().dispatchEvent(new Event('input'));
    await fixture.whenStable();
    expect(field().getAttribute('aria-invalid')).toBe('false');

    field().blur();
    await fixture.whenStable();
    expect(field().getAttribute('aria-invalid')).toBe('true');
    expect(field().value).toBe('5..');
  });

  it('shows the page’s error under the field and names it as its description', async () => {
    fixture.componentInstance.error.set('554 N·m is past the wrench’s range.');
    await fixture.whenStable();

    const described = page.querySelector(`#${field().getAttribute('aria-describedby') ?? 'none'}`);
    expect(described?.textContent).toContain('past the wrench’s range');
  });

  it('leaves the room of the unit beside it to a figure with a unit of its own', async () => {
    fixture.componentInstance.text.set('40,5 ft lb');
    await fixture.whenStable();
    expect(page.querySelector('select')).toBeNull();
    expect(fixture.componentInstance.reading().quantity()).toEqual({ value: 40.5, unit: 'lbf·ft' });
  });

  it('changes its unit and reads the same figure in it', async () => {
    fixture.componentInstance.text.set('27');
    const unit = page.querySelector('select')!;
    unit.value = 'lbf·ft';
    unit.dispatchEvent(new Event('change'));
    await fixture.whenStable();

    expect(fixture.componentInstance.reading().quantity()).toEqual({ value: 27, unit: 'lbf·ft' });
  });
});
