import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import type { AnswerPart } from '@second-spanner/shared/workings/working';
import { DrawingFigure } from '../../drawing/drawing';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { TradeWords } from '../../words/trade-words';
import { isTooWide } from './table-room';

/** Parts of an answer, one below the other: figures, tables, steps and drawings. Judgements stand elsewhere. */
@Component({
  selector: 'ss-answer-parts',
  imports: [DrawingFigure, Sentence, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './answer-parts.html',
  styleUrl: './answer-parts.scss',
})
export class AnswerParts {
  private readonly sessions = inject(SessionStore);

  readonly parts = input.required<readonly AnswerPart[]>();
  /** The facts whose first is the answer itself. */
  readonly main = input<AnswerPart | null>(null);

  protected readonly isTooWide = isTooWide;

  protected say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }
}
