import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import { SortHead } from '../../list/sort-head';
import { ProgressRule } from '../../progress-rule/progress-rule';
import { When } from '../../words/dates';
import { stateNames } from '../../words/names';
import { TradeWords } from '../../words/trade-words';

/** Sheets as a table: which, where they stand, who works on them, how far they are. */
@Component({
  selector: 'ss-sheet-table',
  imports: [ProgressRule, RouterLink, SortHead, TradeWords, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sheet-table.html',
  styleUrl: './sheet-table.scss',
})
export class SheetTable {
  readonly sheets = input.required<readonly SheetSummary[]>();
  /** Off on a car's own page. */
  readonly withCar = input(true);
  /** The order, as in the list's address; null where the table holds only a part and can't be sorted. */
  readonly sort = input<string | null>(null);
  readonly sorted = output<string>();

  protected readonly stateNames = stateNames;
}
