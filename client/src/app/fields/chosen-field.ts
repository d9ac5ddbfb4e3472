import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { TradeWords } from '../words/trade-words';
import { describedBy, FieldNotes } from './field-notes';

export interface Choice {
  readonly value: string;
  /** May hold trade-word tokens. */
  readonly words: string;
}

let fields = 0;

/** A caption over a choice on a rule. */
@Component({
  selector: 'ss-chosen-field',
  imports: [FieldNotes, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="id">{{ label() | tradeWords }}</label>
    <span class="line">
      <select
        #field
        [id]="id"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="notes()"
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
    <ss-field-notes [of]="id" [hint]="hint()" [error]="error()" />
  `,
  styleUrl: './field.scss',
})
export class ChosenField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly choices = input.required<readonly Choice[]>();
  readonly error = input<string | undefined>();
  readonly hint = input<string | null>(null);
  readonly chosen = output<string>();

  protected readonly id = `chosen-${(fields += 1)}`;
  protected readonly isUnknown = computed(() => !this.choices().some(({ value }) => value === this.value()));
  protected readonly notes = computed(() => describedBy(this.id, this.hint(), this.error()));
}
