import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import { ProgressRule } from '../../progress-rule/progress-rule';
import { When } from '../../words/dates';
import { stateNames } from '../../words/names';
import { TradeWords } from '../../words/trade-words';

/** Sheets as a table: which, where they stand, who works on them, how far they are. */
@Component({
  selector: 'ss-sheet-table',
  imports: [ProgressRule, RouterLink, TradeWords, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sheet-table.html',
  styleUrl: './sheet-table.scss',
})
export class SheetTable {
  readonly sheets = input.required<readonly SheetSummary[]>();
  /** Off on a car's own page. */
  readonly withCar = input(true);

  protected readonly stateNames = stateNames;
}
