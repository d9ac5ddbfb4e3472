import { ChangeDetectionStrategy, Component, inject, input, viewChild } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { Observable } from 'rxjs';
import { SessionStore } from '../../session/session-store';
import { Saving } from '../saving/save-state';
import { SayWhy } from '../say-why/say-why';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';

/** What else can be done on a step: raise a snag, or take the critical mark off with a reason. */
@Component({
  selector: 'ss-step-acts',
  imports: [SayWhy],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (step().can.raiseSnag) {
      <ss-say-why
        #snag
        [opener]="say('Raise a {snag}')"
        [label]="say('What is wrong?')"
        [hint]="say('The step stays open until the {snag} is settled.')"
        [act]="say('Raise the {snag}')"
        field="words"
        [draftKey]="key('snag')"
        [saving]="snagSaving"
        (said)="raise($event)"
      />
    }
    @if (step().can.unmarkCritical) {
      <ss-say-why
        #unmark
        opener="Not critical here: say why"
        label="Why is it not critical?"
        hint="No second person checks this step then. The reason is printed on the build sheet."
        act="Take the critical mark off"
        [draftKey]="key('unmark')"
        [saving]="unmarkSaving"
        (said)="unmarkCritical($event)"
      />
    }
  `,
})
export class StepActs {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);
  private readonly snag = viewChild<SayWhy>('snag');
  private readonly unmark = viewChild<SayWhy>('unmark');

  readonly step = input.required<ShownStep>();

  protected readonly snagSaving = new Saving();
  protected readonly unmarkSaving = new Saving();

  protected say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }

  protected key(act: string): string {
    return `${this.store.id()}/${this.step().code}/${act}`;
  }

  protected raise(words: string): Promise<void> {
    const { sheetId, code } = this.step();
    return this.act(this.snagSaving, this.api.raiseSnag(sheetId, code, { words }), this.snag());
  }

  protected unmarkCritical(reason: string): Promise<void> {
    const { sheetId, code } = this.step();
    return this.act(this.unmarkSaving, this.api.unmarkCritical(sheetId, code, { reason }), this.unmark());
  }

  private async act(
    saving: Saving,
    request: Observable<StepDetail>,
    form: SayWhy | undefined,
  ): Promise<void> {
    const step = await saving.follow(request);
    if (step === null) return;
    form?.done();
    this.store.take(step);
  }
}
