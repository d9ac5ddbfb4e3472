import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';
import { TradeWords } from '../words/trade-words';

export interface Choice {
  readonly value: string;
  /** May hold trade-word tokens. */
  readonly words: string;
}

let fields = 0;

/** A caption over a choice on a rule. */
@Component({
  selector: 'ss-chosen-field',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="id">{{ label() | tradeWords }}</label>
    <span class="line">
      <select
        #field
        [id]="id"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="error() ? id + '-error' : null"
        (change)="chosen.emit(field.value)"
      >
        @if (isUnknown()) {
          <option [value]="value()" selected>{{ value() === '' ? 'choose…' : value() }}</option>
        }
        @for (choice of choices(); track choice.value) {
          <option [value]="choice.value" [selected]="choice.value === value()">
            {{ choice.words | tradeWords }}
          </option>
        }
      </select>
    </span>
    <p [id]="id + '-error'" class="error" aria-live="polite">
      @if (error(); as words) {
        <ss-sign name="fail" /><ss-sentence [text]="words" />
      }
    </p>
  `,
  styleUrl: './field.scss',
})
export class ChosenField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly choices = input.required<readonly Choice[]>();
  readonly error = input<string | undefined>();
  readonly chosen = output<string>();

  protected readonly id = `chosen-${(fields += 1)}`;
  protected readonly isUnknown = computed(() => !this.choices().some(({ value }) => value === this.value()));
}
