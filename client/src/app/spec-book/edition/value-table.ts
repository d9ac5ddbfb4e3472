import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { SpecRow } from '@second-spanner/shared/spec/spec-rows';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import { valueLines } from './lines';

/** A section's values, each with its limits, the other printed figure and where it comes from. */
@Component({
  selector: 'ss-value-table',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './value-table.html',
  styleUrl: './value-table.scss',
})
export class ValueTable {
  readonly rows = input.required<readonly SpecRow[]>();

  protected readonly lines = computed(() => valueLines(this.rows()));
  protected readonly withLimits = computed(() => this.rows().some(({ limits }) => limits !== undefined));
  protected readonly withOther = computed(() =>
    this.rows().some(({ alsoPrinted }) => alsoPrinted !== undefined),
  );
}
