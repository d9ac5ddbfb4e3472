import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  input,
  output,
  signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { RowsField as Rows, WorkingCase } from '@second-spanner/shared/workings/working';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';
import { TradeWords } from '../words/trade-words';
import { FieldNotes } from './field-notes';
import { RowCell } from './row-cell';
import { columnUnit, inColumnUnit, shownRows, unitsOf, withCell, withoutRow } from './rows';

let fields = 0;

/** A list of like rows: a table where there is room, else row under row. Rows are added, taken out and cleared. */
@Component({
  selector: 'ss-rows-field',
  imports: [FieldNotes, MatButton, MatIcon, RowCell, Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    '[style.--columns]': 'columns().length',
    '[class]': "columns().length > 4 ? 'many' : 'n' + columns().length",
  },
  templateUrl: './rows-field.html',
  styleUrl: './rows-field.scss',
})
export class RowsField {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  readonly field = input.required<Rows>();
  readonly value = input.required<string>();
  /** Of the whole case, by path: `readings.0.size`. */
  readonly errors = input.required<Readonly<Record<string, string>>>();
  readonly hint = input<string | null>(null);
  readonly typed = output<string>();

  protected readonly id = `rows-${(fields += 1)}`;
  private readonly asked = signal(0);
  private readonly chosen = signal<Readonly<Record<string, Unit>>>({});

  private readonly rows = computed(() => shownRows(this.field(), this.value(), this.asked()));
  protected readonly columns = computed(() =>
    this.field().columns.map((column) => ({
      column,
      unit: columnUnit(column, this.rows(), this.chosen()[column.name]),
      unitChosen: this.chosen()[column.name] !== undefined,
      units: unitsOf(column),
      counts: column.kind === 'number' ? column.counts : null,
    })),
  );
  protected readonly shown = computed(() => {
    const { name } = this.field();
    return this.rows().map((row, i) => ({ row, errors: this.errorsOf(`${name}.${i}.`) }));
  });
  protected readonly isFull = computed(() => this.rows().length >= this.field().most);
  protected readonly isEmpty = computed(() => this.value() === '');

  protected write(row: number, column: string, text: string): void {
    this.typed.emit(withCell(this.field(), this.rows(), { row, column, text }));
  }

  protected chooseUnit(column: string, from: Unit, name: string): void {
    const to = this.columns()
      .flatMap((each) => each.units)
      .find((unit) => unit === name);
    if (to === undefined) return;
    this.chosen.update((chosen) => ({ ...chosen, [column]: to }));
    this.typed.emit(inColumnUnit(this.field(), this.rows(), { column, from, to }));
  }

  protected add(column = 0): void {
    if (this.isFull()) return;
    const row = this.rows().length;
    this.asked.set(row + 1);
    this.focusCell(row, column);
  }

  protected takeOut(row: number): void {
    this.asked.set(this.rows().length - 1);
    this.typed.emit(withoutRow(this.field(), this.rows(), row));
    this.focusCell(Math.max(0, row - 1), 0);
  }

  protected clear(): void {
    this.asked.set(0);
    this.typed.emit('');
    this.focusCell(0, 0);
  }

  protected onFrom(row: number, column: number): void {
    if (row + 1 < this.rows().length) this.focusCell(row + 1, column);
    else this.add(column);
  }

  protected textOf(row: WorkingCase, column: string): string {
    return row[column] ?? '';
  }

  private errorsOf(path: string): Readonly<Record<string, string>> {
    return Object.fromEntries(
      Object.entries(this.errors())
        .filter(([at]) => at.startsWith(path))
        .map(([at, message]) => [at.slice(path.length), message]),
    );
  }

  private focusCell(row: number, column: number): void {
    const cell = `[data-cell="${row},${column}"] :is(input, select)`;
    afterNextRender(() => this.host.nativeElement.querySelector<HTMLElement>(cell)?.focus(), {
      injector: this.injector,
    });
  }
}
