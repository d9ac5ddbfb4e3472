import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { SaveLine } from '../saving/save-line';
import { Saving } from '../saving/save-state';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';
import { When } from '../../words/dates';

/** Calls the second person by e-mail, and says when that was done last. */
@Component({
  selector: 'ss-call-button',
  imports: [MatButton, SaveLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (step().can.call) {
      <button matButton type="button" [disabled]="saving.state().state === 'saving'" (click)="call()">
        Call {{ firstName() }} by e-mail
      </button>
    }
    @if (lastCall(); as call) {
      <p class="small quiet">
        {{ call.to.name }} called at <span class="f">{{ call.at | when }}</span>
      </p>
    }
    @if (saving.state().state === 'failed') {
      <ss-save-line [of]="saving.state()" />
    }
  `,
})
export class CallButton {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);

  readonly step = input.required<ShownStep>();

  protected readonly saving = new Saving();
  protected readonly lastCall = computed(() => this.step().calls.at(-1) ?? null);
  protected readonly firstName = computed(() =>
    this.store.sheet.hasValue() ? (this.store.sheet.value().countersigner.name.split(' ')[0] ?? '') : '',
  );

  protected async call(): Promise<void> {
    const { sheetId, code } = this.step();
    const step = await this.saving.follow(this.api.callSecondPerson(sheetId, code));
    if (step !== null) this.store.take(step);
  }
}
