import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';
import { TradeWords } from '../words/trade-words';

let fields = 0;

/** A caption over a typed value on a rule; what is wrong with it stands below, and what was typed stays. */
@Component({
  selector: 'ss-typed-field',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="id">{{ label() | tradeWords }}</label>
    <span class="line">
      <input
        #field
        class="f"
        [id]="id"
        [value]="value()"
        [attr.inputmode]="keyboard()"
        [attr.placeholder]="example()"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="error() ? id + '-error' : null"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        (input)="typed.emit(field.value)"
      />
      @if (unit(); as words) {
        <span class="quiet">{{ words }}</span>
      }
    </span>
    <p [id]="id + '-error'" class="error" aria-live="polite">
      @if (error(); as words) {
        <ss-sign name="fail" /><ss-sentence [text]="words" />
      }
    </p>
  `,
  styleUrl: './field.scss',
})
export class TypedField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly error = input<string | undefined>();
  readonly example = input<string | null>(null);
  readonly unit = input<string | null>(null);
  readonly keyboard = input<'text' | 'decimal' | 'numeric'>('text');
  readonly typed = output<string>();

  protected readonly id = `typed-${(fields += 1)}`;
}
