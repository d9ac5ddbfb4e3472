import { DOCUMENT } from '@angular/common';
import { inject, Injectable, signal } from '@angular/core';
import { recall, remember } from '../remembered/remembered';

export const lights = ['day', 'lamp'] as const;
export type LightName = (typeof lights)[number];

const grounds: Record<LightName, string> = { day: '#ECEEE8', lamp: '#0E1419' };

/** Day or Lamp: the person's choice on this device; before there is one, the device's. */
@Injectable({ providedIn: 'root' })
export class Light {
  private readonly document = inject(DOCUMENT);
  private readonly lit = signal<LightName>(firstLight());

  readonly light = this.lit.asReadonly();

  /** Lights the page, and prints it by day whatever the screen shows. */
  follow(): void {
    this.show(this.lit());
    addEventListener('beforeprint', () => this.show('day'));
    addEventListener('afterprint', () => this.show(this.lit()));
  }

  choose(light: LightName): void {
    this.lit.set(light);
    remember('light', light);
    this.show(light);
  }

  toggle(): void {
    this.choose(this.lit() === 'day' ? 'lamp' : 'day');
  }

  private show(light: LightName): void {
    this.document.body.dataset['light'] = light;
    this.document.querySelector('meta[name=theme-color]')?.setAttribute('content', grounds[light]);
  }
}

function firstLight(): LightName {
  const chosen = recall('light');
  if (chosen === 'day' || chosen === 'lamp') return chosen;
  return matchMedia('(prefers-color-scheme: dark)').matches ? 'lamp' : 'day';
}
