import { ChangeDetectionStrategy, Component, effect, inject, input } from '@angular/core';
import { PageTitle } from '../../layout/page-title';
import { laterPart } from '../../states/later-part';
import { LoadState } from '../../states/load-state';
import { SheetHead } from '../sheet/sheet-head';
import { notOnThisDevice, SheetStore } from '../sheet-store';
import { loadWork } from './load-work';
import { StepHand } from './step-hand';

/** A step by its address, with the work of its kind. */
@Component({
  selector: 'ss-step-page',
  imports: [LoadState, SheetHead, StepHand],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let step = store.step();
    @if (step && work.hasValue() && store.judge()) {
      @for (one of [step]; track one.code) {
        <ss-step-hand [step]="one" [work]="work.value()" />
      }
    } @else {
      <ss-sheet-head
        [heading]="'Step ' + code()"
        [back]="['/sheets', store.id()]"
        backLabel="Stages of this sheet"
      />
      @if (step) {
        <ss-load-state class="sheet" what="the step" [from]="work.hasValue() ? store.judging : work" />
      } @else {
        <ss-load-state class="sheet" what="the step" [from]="store.detail" />
      }
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

  protected readonly work = laterPart(() => {
    const kind = this.store.kind();
    return kind === null ? undefined : loadWork[kind];
  }, notOnThisDevice);

  constructor() {
    effect(() => this.store.openStep(this.code()));
    effect(() => this.title.name(`Step ${this.code()}`));
  }
}
