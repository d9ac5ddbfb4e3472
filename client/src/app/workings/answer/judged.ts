import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { AnswerPart, WorkingAnswer } from '@second-spanner/shared/workings/working';
import { judgementSign, judgementWord } from '@second-spanner/shared/workings/judgement-words';
import { Sentence } from '../../quantity/sentence';
import { CautionSign } from '../../sheets/step/caution-sign';
import { VerdictLine } from '../../verdict/verdict';
import { TradeWords } from '../../words/trade-words';
import { AnswerParts } from './answer-parts';

/** What is said of a case: each judgement, its cautions, and the figures beside it. */
@Component({
  selector: 'ss-judged',
  imports: [AnswerParts, CautionSign, Sentence, TradeWords, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './judged.html',
  styleUrl: './judged.scss',
})
export class Judged {
  readonly answer = input.required<WorkingAnswer>();
  /** Figures that stand beside the judgement. */
  readonly facts = input.required<readonly AnswerPart[]>();
  /** The facts whose first is the answer itself. */
  readonly main = input<AnswerPart | null>(null);

  protected readonly sign = judgementSign;
  protected readonly word = judgementWord;
  protected readonly judgements = computed(() =>
    this.answer().parts.filter((part) => part.kind === 'judgement'),
  );
}
