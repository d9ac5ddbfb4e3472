import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import { unitTaken } from '@second-spanner/shared/workings/unit-taken';
import type { CellField } from '@second-spanner/shared/workings/working';
import { TradeWords } from '../words/trade-words';
import { inCell } from './rows';
import { withUnit } from './split-unit';

const types = { date: 'date', moment: 'datetime-local' } as const;

/** One cell of a list: what is typed in it, without the unit that stands over its column. */
@Component({
  selector: 'ss-row-cell',
  imports: [TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (choices(); as choices) {
      <select
        #choice
        [attr.aria-label]="label() | tradeWords"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="error() ? errorId() : null"
        (change)="typed.emit(choice.value)"
      >
        @for (each of choices.choices; track each.value) {
          <option [value]="each.value" [selected]="each.value === (value() || choices.starts)">
            {{ each.words | tradeWords }}
          </option>
        }
      </select>
    } @else {
      <input
        #field
        [class.f]="figures()"
        [type]="type()"
        [value]="shown()"
        [attr.inputmode]="keyboard()"
        [attr.aria-label]="label() | tradeWords"
        [attr.aria-invalid]="error() ? true : null"
        [attr.aria-describedby]="error() ? errorId() : null"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        (input)="write(field.value)"
        (blur)="typing.set(null)"
        (keydown.enter)="done.emit()"
      />
    }
  `,
  styleUrl: './field.scss',
})
export class RowCell {
  readonly column = input.required<CellField>();
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  readonly unit = input.required<Unit | null>();
  /** Whether the person chose that unit; if not, a bare fraction of a length is in inches. */
  readonly unitChosen = input.required<boolean>();
  readonly error = input<string | undefined>();
  readonly errorId = input.required<string>();
  readonly typed = output<string>();
  /** Enter was pressed: on to the next row. */
  readonly done = output();

  protected readonly typing = signal<string | null>(null);
  protected readonly shown = computed(() => this.typing() ?? inCell(this.value(), this.unit()));
  protected readonly choices = computed(() => {
    const column = this.column();
    return column.kind === 'choice' ? column : null;
  });
  protected readonly type = computed(() => {
    const { kind } = this.column();
    return kind === 'date' || kind === 'moment' ? types[kind] : 'text';
  });
  protected readonly figures = computed(() => {
    const column = this.column();
    return column.kind !== 'text' || column.figures === true;
  });
  protected readonly keyboard = computed(() => {
    const column = this.column();
    if (column.kind === 'quantity')
      return column.signed === true || this.unit() === 'in' ? 'text' : 'decimal';
    return column.kind === 'number' && column.signed !== true ? 'decimal' : 'text';
  });

  protected write(text: string): void {
    this.typing.set(text);
    const unit = this.unitOf(text);
    this.typed.emit(unit === null ? text : withUnit(text, unit));
  }

  private unitOf(text: string): Unit | null {
    const [column, unit] = [this.column(), this.unit()];
    if (unit === null || this.unitChosen() || column.kind !== 'quantity') return unit;
    return unitTaken({ of: column.of, unit }, text);
  }
}
