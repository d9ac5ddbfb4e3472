import { DOCUMENT } from '@angular/common';
import { inject, Injectable, signal } from '@angular/core';
import { recall, remember } from '../remembered/remembered';

/** Which keys type a reading: the page's own, or the device's. The person's choice on this device. */
@Injectable({ providedIn: 'root' })
export class OwnKeypad {
  private readonly document = inject(DOCUMENT);
  private readonly own = signal(firstChoice());

  private readonly covered = signal(0);

  readonly isOwn = this.own.asReadonly();
  /** CSS pixels of the page's foot that the keypad covers; 0 while it is away. */
  readonly height = this.covered.asReadonly();

  choose(own: boolean): void {
    this.own.set(own);
    remember('keypad', own ? 'own' : 'device');
  }

  /** How much of the page's foot the keypad covers, so that the foot's action stays above it. */
  cover(height: number): void {
    this.covered.set(height);
    this.document.documentElement.style.setProperty('--ss-keypad', `${height}px`);
  }
}

function firstChoice(): boolean {
  const chosen = recall('keypad');
  return chosen === null ? matchMedia('(pointer: coarse)').matches : chosen === 'own';
}
