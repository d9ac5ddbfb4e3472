import { provideHttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { beforeEach, describe, expect, it } from 'vitest';
import { TurnField } from './turn-field';

@Component({
  imports: [TurnField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<ss-turn-field
    label="Crank"
    [from]="0"
    [to]="720"
    [value]="text()"
    (typed)="text.set($event)"
  />`,
})
class Page {
  readonly text = signal('');
}

describe('an angle that is turned', () => {
  let fixture: ComponentFixture<Page>;
  let page: HTMLElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({ providers: [provideHttpClient(), provideRouter([])] });
    fixture = TestBed.createComponent(Page);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  const text = (): string => fixture.componentInstance.text();
  const typed = (): HTMLInputElement => page.querySelector('input[inputmode]')!;
  const slider = (): HTMLInputElement => page.querySelector('input[type=range]')!;
  const press = async (sign: string): Promise<void> => {
    [...page.querySelectorAll('button')].find((button) => button.textContent.trim() === sign)!.click();
    await fixture.whenStable();
  };
  const key = async (on: HTMLInputElement, name: string): Promise<boolean> => {
    const event = new KeyboardEvent('keydown', { key: name, cancelable: true });
    on.dispatchEvent(event);
    await fixture.whenStable();
    return event.defaultPrevented;
  };

  it('turns by its buttons, from nothing typed on, and goes round', async () => {
    await press('+10');
    await press('−1');
    expect(text()).toBe('9');
    await press('−10');
    expect(text()).toBe('719');
  });

  it('turns by the keys: by one, by ten with page keys', async () => {
    await key(slider(), 'ArrowRight');
    await key(slider(), 'PageUp');
    await key(typed(), 'ArrowUp');
    expect(text()).toBe('12');
    await key(slider(), 'ArrowDown');
    expect(text()).toBe('11');
  });

  it('leaves the arrows to the sides to the caret in the text', async () => {
    expect(await key(typed(), 'ArrowLeft')).toBe(false);
    expect(text()).toBe('');
  });

  it('is typed too, with a decimal comma, and the slider follows', async () => {
    fixture.componentInstance.text.set('190,5');
    await fixture.whenStable();
    expect(typed().value).toBe('190,5');
    expect(slider().getAttribute('aria-valuetext')).toBe('190.5 degrees');
    await press('+1');
    expect(text()).toBe('191.5');
  });

  it('keeps what is no angle as it was typed', async () => {
    fixture.componentInstance.text.set('half');
    await fixture.whenStable();
    expect(typed().value).toBe('half');
    expect(slider().value).toBe('0');
  });
});
