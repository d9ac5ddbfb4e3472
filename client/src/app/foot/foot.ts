import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { OwnKeypad } from '../reading/own-keypad';

/** The foot of a page at the stand: its one action, always in reach, above the keypad when that is up. */
@Component({
  selector: 'ss-foot',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(mousedown)': 'keepFocus($event)' },
  template: '<ng-content />',
  styles: `
    :host {
      position: sticky;
      bottom: var(--ss-keypad, 0);
      z-index: 4;
      display: flex;
      flex-direction: column;
      gap: var(--ss-2);
      margin-top: auto;
      padding: 10px var(--ss-4);
      background: var(--ss-paper);
      border-top: var(--ss-hair) solid var(--ss-rule);
      --mat-button-filled-container-height: 56px;
      --mat-button-filled-label-text-size: 18px;
    }
  `,
})
export class Foot {
  private readonly keypads = inject(OwnKeypad);

  /** The keypad stands while its field has the focus; were it to go at a touch, the action would move away. */
  protected keepFocus(event: Event): void {
    if (this.keypads.height() > 0) event.preventDefault();
  }
}
