import { provideHttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { RowsField as Rows } from '@second-spanner/shared/workings/working';
import { beforeEach, describe, expect, it } from 'vitest';
import { provideIcons } from '../layout/icons';
import { RowsField } from './rows-field';

const field: Rows = {
  kind: 'rows',
  name: 'readings',
  label: 'Readings',
  row: 'reading',
  least: 1,
  most: 3,
  columns: [
    { kind: 'quantity', name: 'size', label: 'Size', of: 'length', unit: 'mm' },
    { kind: 'text', name: 'where', label: 'Where' },
  ],
};

@Component({
  imports: [RowsField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<ss-rows-field
    [field]="field"
    [value]="text()"
    [errors]="errors()"
    (typed)="text.set($event)"
  />`,
})
class Page {
  readonly field = field;
  readonly text = signal('');
  readonly errors = signal<Readonly<Record<string, string>>>({});
}

describe('a list of rows', () => {
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

  const text = (): string => fixture.componentInstance.text();
  const cell = (label: string): HTMLInputElement => page.querySelector(`[aria-label="${label}"]`)!;
  const rows = (): number => page.querySelectorAll('.row').length;
  const type = async (label: string, typed: string): Promise<void> => {
    cell(label).value = typed;
    cell(label).dispatchEvent(new Event('input'));
    await fixture.whenStable();
  };
  const press = async (words: string): Promise<void> => {
    const buttons = [...page.querySelectorAll('button')];
    buttons
      .find((button) => (button.getAttribute('aria-label') ?? button.textContent).trim() === words)!
      .click();
    await fixture.whenStable();
  };

  it('keeps each cell, its figures in the unit over the column', async () => {
    await type('reading 1, Size', '53,96');
    await type('reading 1, Where', 'front');
    expect(text()).toBe('53,96 mm|front');
  });

  it('adds rows up to the most, takes them out and clears them', async () => {
    await type('reading 1, Size', '1');
    await press('Add another reading');
    expect(document.activeElement).toBe(cell('reading 2, Size'));
    await type('reading 2, Size', '2');
    await press('Add another reading');
    expect(rows()).toBe(3);
    await press('Add another reading');
    expect(rows()).toBe(3);
    await press('Take out reading 1');
    expect(text()).toBe('2 mm|');
    expect(rows()).toBe(2);
    await press('Clear');
    expect(text()).toBe('');
    expect(rows()).toBe(1);
  });

  it('goes on to the next row by Enter, and makes one at the end', async () => {
    cell('reading 1, Where').dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter' }));
    await fixture.whenStable();
    expect(rows()).toBe(2);
    expect(document.activeElement).toBe(cell('reading 2, Where'));
  });

  it('says a column in another unit, the figures as they were typed', async () => {
    await type('reading 1, Size', '1.5');
    const unit = page.querySelector<HTMLSelectElement>('[aria-label="Unit, Size"]')!;
    unit.value = 'thou';
    unit.dispatchEvent(new Event('change'));
    await fixture.whenStable();
    expect(text()).toBe('1.5 thou|');
    expect(cell('reading 1, Size').value).toBe('1.5');
  });

  it('says what is wrong at its cell', async () => {
    await type('reading 1, Size', 'wide');
    fixture.componentInstance.errors.set({ 'readings.0.size': 'Write a number.' });
    await fixture.whenStable();
    const notes = cell('reading 1, Size').getAttribute('aria-describedby')!;
    expect(page.querySelector(`#${notes}`)?.textContent).toContain('Size: Write a number.');
    expect(cell('reading 1, Where').getAttribute('aria-invalid')).toBeNull();
    expect(cell('reading 1, Size').value).toBe('wide');
  });
});
