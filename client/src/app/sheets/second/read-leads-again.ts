import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { WiringStep } from '@second-spanner/shared/contracts/steps';
import { Foot } from '../../foot/foot';
import { TradeWords } from '../../words/trade-words';
import { draft } from '../drafts/draft';
import { cylindersByOutlet, isFittedDraft, nothingFitted, outletsOf } from '../kinds/wiring/fitted';
import { FittedFields } from '../kinds/wiring/fitted-fields';
import { SaveLine } from '../saving/save-line';
import { SecondWork } from './second-work';

/** The leads read again outlet by outlet, with neither map nor first reading in sight. */
@Component({
  selector: 'ss-read-leads-again',
  imports: [FittedFields, Foot, MatButton, SaveLine, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-fitted-fields
      [definition]="definition()"
      [(fitted)]="fitted"
      [error]="work.errorAt('content.fitted')"
    />
    <ss-foot>
      <ss-save-line [of]="work.saving.state()" />
      <button
        matButton="filled"
        type="button"
        [disabled]="!isWhole() || work.saving.state().state === 'saving'"
        (click)="keep()"
      >
        {{ 'Keep the {leads} as I read them' | tradeWords }}
      </button>
    </ss-foot>
  `,
  styleUrl: './part.scss',
})
export class ReadLeadsAgain {
  protected readonly work = inject(SecondWork);

  readonly definition = input.required<WiringStep>();

  protected readonly fitted = draft(() => this.work.draftKey('fitted'), nothingFitted, isFittedDraft);
  protected readonly isWhole = computed(() =>
    outletsOf(this.definition()).every((outlet) => (this.fitted()[outlet] ?? '') !== ''),
  );

  protected async keep(): Promise<void> {
    const fitted = cylindersByOutlet(this.definition(), this.fitted());
    if (await this.work.keepReading({ kind: 'read-again', fitted })) this.fitted.set(nothingFitted);
  }
}
