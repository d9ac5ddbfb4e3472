import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { TradeWords } from '../words/trade-words';
import { describedBy, FieldNotes } from './field-notes';
import { turned } from './turn';

const ofKeys: Readonly<Record<string, number>> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
};

let fields = 0;

/** An angle that is turned: by the slider, by buttons, by the arrow keys, or typed. It goes round. */
@Component({
  selector: 'ss-turn-field',
  imports: [FieldNotes, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="head">
      <label [for]="id">{{ label() | tradeWords }}</label>
      <span class="line">
        <input
          #field
          class="f"
          [id]="id"
          [value]="value()"
          inputmode="decimal"
          [attr.aria-invalid]="error() ? true : null"
          [attr.aria-describedby]="notes()"
          autocomplete="off"
          (input)="typed.emit(field.value)"
          (keydown)="turnByKey($event)"
        />
        <span class="quiet" aria-hidden="true">°</span>
      </span>
    </div>
    <input
      #slider
      type="range"
      step="1"
      [attr.aria-label]="label() + ', slider' | tradeWords"
      [attr.aria-valuetext]="angle() + ' degrees'"
      [min]="from()"
      [max]="to()"
      [value]="angle()"
      (input)="typed.emit(slider.value)"
      (keydown)="turnByKey($event)"
    />
    <div class="buttons">
      @for (by of steps; track by.degrees) {
        <button type="button" [attr.aria-label]="by.words" (click)="turn(by.degrees)">{{ by.sign }}</button>
      }
    </div>
    <ss-field-notes [of]="id" [hint]="hint()" [error]="error()" />
  `,
  styleUrl: './turn-field.scss',
})
export class TurnField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  /** Degrees, both included. */
  readonly from = input.required<number>();
  readonly to = input.required<number>();
  readonly error = input<string | undefined>();
  readonly hint = input<string | null>(null);
  readonly typed = output<string>();

  protected readonly id = `turn-${(fields += 1)}`;
  protected readonly notes = computed(() => describedBy(this.id, this.hint(), this.error()));
  protected readonly steps = [
    { degrees: -10, sign: '−10', words: 'Back 10 degrees' },
    { degrees: -1, sign: '−1', words: 'Back 1 degree' },
    { degrees: 1, sign: '+1', words: 'On 1 degree' },
    { degrees: 10, sign: '+10', words: 'On 10 degrees' },
  ];
  /** Where the slider stands: what was typed where that is an angle, else at the beginning. */
  protected readonly angle = computed(() => {
    const angle = Number(this.value().trim().replace(',', '.').replace('−', '-'));
    const isAngle = this.value().trim() !== '' && Number.isFinite(angle);
    return isAngle ? turned(angle, 0, { from: this.from(), to: this.to() }) : this.from();
  });

  protected turn(degrees: number): void {
    this.typed.emit(String(turned(this.angle(), degrees, { from: this.from(), to: this.to() })));
  }

  protected turnByKey(event: KeyboardEvent): void {
    const inText = event.target instanceof HTMLInputElement && event.target.type !== 'range';
    const degrees = ofKeys[event.key];
    // In the text the arrows to the sides move the caret.
    if (degrees === undefined || (inText && /Left|Right/.test(event.key))) return;
    event.preventDefault();
    this.turn(degrees);
  }
}
