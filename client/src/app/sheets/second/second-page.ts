import { ChangeDetectionStrategy, Component, effect, inject, input } from '@angular/core';
import { PageTitle } from '../../layout/page-title';
import { LoadState } from '../../states/load-state';
import { SheetHead } from '../sheet/sheet-head';
import { SheetStore } from '../sheet-store';
import { SecondHand } from './second-hand';

/** The second person's check of a step, by its address. */
@Component({
  selector: 'ss-second-page',
  imports: [LoadState, SecondHand, SheetHead],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (store.step(); as step) {
      @for (one of [step]; track one.code) {
        <ss-second-hand [step]="one" />
      }
    } @else {
      <ss-sheet-head
        [heading]="'Second check of step ' + code()"
        [back]="['/sheets', store.id(), 'steps', code()]"
      />
      <ss-load-state class="sheet" what="the step" [from]="store.detail" />
    }
  `,
  styles: `
    :host,
    ss-second-hand {
      display: flex;
      flex-direction: column;
      flex: 1;
    }
  `,
})
export class SecondPage {
  protected readonly store = inject(SheetStore);
  private readonly title = inject(PageTitle);

  /** From the address. */
  readonly code = input.required<string>();

  constructor() {
    effect(() => this.store.openStep(this.code()));
    effect(() => this.title.name(`Second check, step ${this.code()}`));
  }
}
