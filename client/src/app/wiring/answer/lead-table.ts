import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CapDiagnosis, CapMap } from '@second-spanner/shared/contracts/calculations';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import {
  companionWords,
  intervalWords,
  leadRows,
} from '@second-spanner/shared/workings/wiring-map/map-words';

/** Which lead goes where, in the order in which the rotor meets the posts; with what is fitted, what comes of it. */
@Component({
  selector: 'ss-lead-table',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './lead-table.html',
  styleUrl: './lead-table.scss',
})
export class LeadTable {
  readonly map = input.required<CapMap>();
  readonly diagnosis = input.required<CapDiagnosis | null>();
  readonly traced = input.required<boolean>();

  protected readonly rows = computed(() => leadRows(this.map(), this.diagnosis()));
  protected readonly companions = computed(() => companionWords(this.map()));
  protected readonly intervals = computed(() => intervalWords(this.map()));
}
