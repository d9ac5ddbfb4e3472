import { Injectable, signal } from '@angular/core';

const deskWidth = '(min-width: 960px)';

/** Whether the window is as wide as a desk's: where page and phone differ in more than their styles. */
@Injectable({ providedIn: 'root' })
export class Wide {
  private readonly query = matchMedia(deskWidth);
  private readonly matches = signal(this.query.matches);

  readonly isDesk = this.matches.asReadonly();

  constructor() {
    this.query.addEventListener('change', ({ matches }) => this.matches.set(matches));
  }
}
