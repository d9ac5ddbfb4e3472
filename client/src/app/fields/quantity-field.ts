import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { units, type Kind, type Unit } from '@second-spanner/shared/contracts/quantity';
import { kindOfUnit } from '@second-spanner/shared/quantities/unit-names';
import { unitTaken } from '@second-spanner/shared/workings/unit-taken';
import { TradeWords } from '../words/trade-words';
import { describedBy, FieldNotes } from './field-notes';
import { joinUnit, splitUnit, withUnit } from './split-unit';

let fields = 0;

/**
 * A figure with its unit chosen beside it. The value is one text, `27 lbf·ft`; a unit typed behind the figure is
 * taken as chosen. Another unit leaves the figure as it was typed: nobody meant it to be converted. A bare fraction
 * of a length is in inches unless its unit was chosen.
 */
@Component({
  selector: 'ss-quantity-field',
  imports: [FieldNotes, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="id">{{ label() | tradeWords }}</label>
    <span class="line">
      <input
        #field
        class="f"
        [id]="id"
        [value]="shown()"
        [attr.inputmode]="keyboard()"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="notes()"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        (input)="type(field.value)"
        (blur)="typing.set(null)"
      />
      <select
        #choice
        class="unit"
        [attr.aria-label]="'Unit, ' + label() | tradeWords"
        (change)="choose(choice.value)"
      >
        @for (each of choices(); track each) {
          <option [value]="each" [selected]="each === shownUnit()">{{ each }}</option>
        }
      </select>
    </span>
    <ss-field-notes [of]="id" [hint]="hint()" [error]="error()" />
  `,
  styleUrl: './field.scss',
})
export class QuantityField {
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly kind = input.required<Kind>();
  /** The unit while nothing says another. */
  readonly unit = input.required<Unit>();
  readonly signed = input(false);
  readonly error = input<string | undefined>();
  readonly hint = input<string | null>(null);
  readonly typed = output<string>();

  protected readonly id = `quantity-${(fields += 1)}`;
  protected readonly notes = computed(() => describedBy(this.id, this.hint(), this.error()));
  protected readonly choices = computed<readonly Unit[]>(() => units[this.kind()]);
  /** What stands in the field while it is typed in, left alone until it is done. */
  protected readonly typing = signal<string | null>(null);
  private readonly chosen = signal<Unit | null>(null);
  private readonly byHand = signal(false);
  /** What stood beside a fraction before it was taken for inches. */
  private readonly beforeFraction = signal<Unit | null>(null);

  private readonly parted = computed(() => {
    const { figure, unit } = splitUnit(this.value());
    return unit !== undefined && kindOfUnit(unit) === this.kind()
      ? { figure, unit }
      : { figure: this.value() };
  });
  protected readonly shown = computed(() => this.typing() ?? this.parted().figure);
  protected readonly shownUnit = computed<Unit>(() => {
    const { figure, unit } = this.parted();
    return unit ?? (figure === '' ? this.chosen() : null) ?? this.unit();
  });
  /** Minus signs and fractions are not on a phone's decimal keys. */
  protected readonly keyboard = computed(() =>
    this.signed() || this.shownUnit() === 'in' ? 'text' : 'decimal',
  );

  protected type(text: string): void {
    const before = this.beforeFraction() ?? this.shownUnit();
    const unit = this.byHand() ? before : unitTaken({ of: this.kind(), unit: before }, text);
    this.beforeFraction.set(unit === before ? null : before);
    this.typing.set(text);
    this.chosen.set(unit);
    this.typed.emit(withUnit(text, unit));
  }

  protected choose(name: string): void {
    const unit = this.choices().find((each) => each === name);
    if (unit === undefined) return;
    this.byHand.set(true);
    this.beforeFraction.set(null);
    this.chosen.set(unit);
    this.typed.emit(joinUnit(this.parted().figure, unit));
  }
}
