import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { WorkingAnswer } from '@second-spanner/shared/workings/working';
import { Sentence } from '../../quantity/sentence';
import { TradeWords } from '../../words/trade-words';

/** What an answer rests on: what was assumed, and by which formula it was worked out. */
@Component({
  selector: 'ss-grounds',
  imports: [Sentence, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './grounds.html',
  styleUrl: './judged.scss',
})
export class Grounds {
  readonly answer = input.required<WorkingAnswer>();
}
