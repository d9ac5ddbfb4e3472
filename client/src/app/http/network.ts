import { Injectable, signal } from '@angular/core';

/** Whether the api was reachable when last tried. */
@Injectable({ providedIn: 'root' })
export class Network {
  private readonly reached = signal(navigator.onLine);

  readonly reachable = this.reached.asReadonly();

  constructor() {
    addEventListener('offline', () => this.reached.set(false));
    addEventListener('online', () => this.reached.set(true));
  }

  answered(): void {
    this.reached.set(true);
  }

  unanswered(): void {
    this.reached.set(false);
  }
}
