import { ChangeDetectionStrategy, Component, effect, inject, input } from '@angular/core';
import { PageTitle } from '../../layout/page-title';
import { LoadState } from '../../states/load-state';
import { SheetHead } from '../sheet/sheet-head';
import { SheetStore } from '../sheet-store';
import { StepHand } from './step-hand';

/** A step by its address. */
@Component({
  selector: 'ss-step-page',
  imports: [LoadState, SheetHead, StepHand],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (store.step(); as step) {
      @for (one of [step]; track one.code) {
        <ss-step-hand [step]="one" />
      }
    } @else {
      <ss-sheet-head
        [heading]="'Step ' + code()"
        [back]="['/sheets', store.id()]"
        backLabel="Stages of this sheet"
      />
      <ss-load-state class="sheet" what="the step" [from]="store.detail" />
    }
  `,
  styles: `
    :host,
    ss-step-hand {
      display: flex;
      flex-direction: column;
      flex: 1;
    }
  `,
})
export class StepPage {
  protected readonly store = inject(SheetStore);
  private readonly title = inject(PageTitle);

  /** From the address. */
  readonly code = input.required<string>();

  constructor() {
    effect(() => this.store.openStep(this.code()));
    effect(() => this.title.name(`Step ${this.code()}`));
  }
}
