import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { TradeWords } from '../words/trade-words';
import { describedBy, FieldNotes } from './field-notes';

let fields = 0;

/** A caption over a typed value on a rule; what is wrong with it stands below, and what was typed stays. */
@Component({
  selector: 'ss-typed-field',
  imports: [FieldNotes, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="id">{{ label() | tradeWords }}</label>
    <span class="line">
      <input
        #field
        [class.f]="figures()"
        [id]="id"
        [type]="type()"
        [value]="value()"
        [attr.inputmode]="keyboard()"
        [attr.placeholder]="example()"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="notes()"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        (input)="typed.emit(field.value)"
      />
      @if (unit(); as words) {
        <span class="quiet">{{ words }}</span>
      }
    </span>
    <ss-field-notes [of]="id" [hint]="hint()" [error]="error()" />
  `,
  styleUrl: './field.scss',
})
export class TypedField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly error = input<string | undefined>();
  readonly hint = input<string | null>(null);
  readonly example = input<string | null>(null);
  readonly unit = input<string | null>(null);
  readonly keyboard = input<'text' | 'decimal' | 'numeric'>('text');
  readonly type = input<'text' | 'date' | 'datetime-local'>('text');
  /** Set in the figures face. */
  readonly figures = input(true);
  readonly typed = output<string>();

  protected readonly id = `typed-${(fields += 1)}`;
  protected readonly notes = computed(() => describedBy(this.id, this.hint(), this.error()));
}
