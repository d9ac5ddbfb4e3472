import { provideHttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Kind, Unit } from '@second-spanner/shared/contracts/quantity';
import { beforeEach, describe, expect, it } from 'vitest';
import { QuantityField } from './quantity-field';

@Component({
  imports: [QuantityField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<ss-quantity-field
    label="Figure"
    [kind]="kind()"
    [unit]="unit()"
    [value]="text()"
    [error]="error()"
    (typed)="text.set($event)"
  />`,
})
class Page {
  readonly kind = signal<Kind>('torque');
  readonly unit = signal<Unit>('N·m');
  readonly text = signal('');
  readonly error = signal<string | undefined>(undefined);
}

describe('a quantity field', () => {
  let fixture: ComponentFixture<Page>;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({ providers: [provideHttpClient(), provideRouter([])] });
    fixture = TestBed.createComponent(Page);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  const field = (): HTMLInputElement => page.querySelector('input')!;
  const unit = (): HTMLSelectElement => page.querySelector('select')!;
  const text = (): string => fixture.componentInstance.text();
  const type = async (typed: string): Promise<void> => {
    field().value = typed;
    field().dispatchEvent(new Event('input'));
    await fixture.whenStable();
  };
  const leave = async (): Promise<void> => {
    field().dispatchEvent(new Event('blur'));
    await fixture.whenStable();
  };
  const choose = async (name: string): Promise<void> => {
    unit().value = name;
    unit().dispatchEvent(new Event('change'));
    await fixture.whenStable();
  };

  it('says a figure in the unit that stands beside it', async () => {
    await type('36,6');
    expect(text()).toBe('36,6 N·m');
    expect(field().value).toBe('36,6');
  });

  it('takes the unit that is typed, and leaves what is typed alone until it is done', async () => {
    await type('27 lb ft');
    expect(field().value).toBe('27 lb ft');
    expect(text()).toBe('27 lb ft');
    expect(unit().value).toBe('lbf·ft');
    await leave();
    expect(field().value).toBe('27');
    await type('28');
    expect(text()).toBe('28 lbf·ft');
  });

  it('leaves the figure as it is when another unit is chosen', async () => {
    await type('27');
    await choose('lbf·ft');
    expect(text()).toBe('27 lbf·ft');
    expect(field().value).toBe('27');
  });

  it('keeps the chosen unit while there is no figure yet', async () => {
    await choose('kgf·m');
    expect(text()).toBe('');
    await type('3');
    expect(text()).toBe('3 kgf·m');
  });

  it('keeps what it cannot read, and says so at the field', async () => {
    await type('27 furlongs');
    fixture.componentInstance.error.set('There is no unit “furlongs”.');
    await leave();
    expect(field().value).toBe('27 furlongs');
    expect(field().getAttribute('aria-invalid')).toBe('true');
    const notes = field().getAttribute('aria-describedby')!;
    expect(page.querySelector(`#${notes}`)?.textContent).toContain('There is no unit “furlongs”.');
  });

  it('shows a unit of another kind as it was typed, rather than as one of its own', async () => {
    await type('27 mm');
    await leave();
    expect(field().value).toBe('27 mm');
    expect(unit().value).toBe('N·m');
  });

  describe('of a length in millimetres', () => {
    beforeEach(async () => {
      fixture.componentInstance.kind.set('length');
      fixture.componentInstance.unit.set('mm');
      await fixture.whenStable();
    });

    it('takes a bare fraction for inches, and shows it', async () => {
      await type('1 3');
      expect(unit().value).toBe('mm');
      await type('1 3/4');
      expect(text()).toBe('1 3/4 in');
      expect(unit().value).toBe('in');
      expect(field().value).toBe('1 3/4');
    });

    it('goes back to millimetres once it is no fraction any more', async () => {
      await type('3/16');
      await type('4.8');
      expect(text()).toBe('4.8 mm');
    });

    it('leaves a fraction in a unit that was chosen', async () => {
      await choose('mm');
      await type('1/2');
      expect(text()).toBe('1/2 mm');
    });
  });
});
