import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { WorkingField } from '@second-spanner/shared/workings/working';
import { ChosenField } from '../../fields/chosen-field';
import { QuantityField } from '../../fields/quantity-field';
import { RowsField } from '../../fields/rows-field';
import { TurnField } from '../../fields/turn-field';
import { TypedField } from '../../fields/typed-field';

/** One field of a working, of whatever kind it is. */
@Component({
  selector: 'ss-working-field',
  imports: [ChosenField, QuantityField, RowsField, TurnField, TypedField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './working-field.html',
  styles: ':host { display: block; min-width: 0; }',
})
export class WorkingFieldControl {
  readonly field = input.required<WorkingField>();
  readonly value = input.required<string>();
  /** Of the whole case, by path. */
  readonly errors = input.required<Readonly<Record<string, string>>>();
  readonly typed = output<string>();

  protected readonly error = computed(() => this.errors()[this.field().name]);
  protected readonly hint = computed(() => {
    const { hint, optional } = this.field();
    if (optional === undefined) return hint ?? null;
    return [...(hint === undefined ? [] : [asSentence(hint)]), ifLeftOpen(optional)].join(' ');
  });
}

const asSentence = (words: string): string => (/[.?!:]$/.test(words) ? words : `${words}.`);

const ifLeftOpen = (taken: string): string =>
  taken === '' ? 'May be left open.' : asSentence(`Left open: ${taken}`);
