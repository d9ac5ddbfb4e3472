import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { StepDefinition } from '@second-spanner/shared/contracts/steps';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { signOf, signWords } from '../../verdict/signs';
import { entryWords } from '../entry-words';
import { StepWork } from '../step-work';

/** While an entry is about to be replaced: which one, why, and the way back. */
@Component({
  selector: 'ss-correction',
  imports: [Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (replaced(); as words) {
      <div class="plate">
        <p>Replaces <ss-sentence [text]="words" /></p>
        <label for="replace-reason">Why is it replaced?</label>
        <input
          #reason
          id="replace-reason"
          type="text"
          maxlength="500"
          autocomplete="off"
          [value]="work.reason()"
          [attr.aria-invalid]="error() !== null"
          [attr.aria-describedby]="error() === null ? null : 'replace-reason-error'"
          (input)="work.reason.set(reason.value)"
        />
        @if (error(); as sentence) {
          <p id="replace-reason-error" class="small error" role="alert">
            <ss-sign name="fail" />{{ sentence }}
          </p>
        }
        <button type="button" class="leave" (click)="work.choose(null)">Leave it as it was</button>
      </div>
    }
  `,
  styleUrl: './correction.scss',
})
export class Correction {
  protected readonly work = inject(StepWork);

  readonly definition = input.required<StepDefinition>();

  protected readonly replaced = computed(() => {
    const entry = this.work.replaced();
    if (entry === null || entry.inTray !== null) return null;
    const word = signWords[signOf(entry.verdict)].toLowerCase();
    return `${entryWords(this.definition(), entry.content)}, ${word}`;
  });
  protected readonly error = computed(() => this.work.errorAt('reason'));
}
