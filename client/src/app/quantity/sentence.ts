import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { SessionStore } from '../session/session-store';
import { partFigures } from './figures';

/** A sentence in the person's trade words, its figures set as figures and never parted from their units. */
@Component({
  selector: 'ss-sentence',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `@for (piece of pieces(); track $index) {
    @if (piece.figure; as figure) {
      <span class="n"
        ><span class="f">{{ figure }}</span>
        @if (piece.unit; as unit) {
          <span class="u">&thinsp;{{ unit }}</span>
        }
      </span>
    } @else {
      <ng-container>{{ piece.words }}</ng-container>
    }
  }`,
})
export class Sentence {
  private readonly sessions = inject(SessionStore);

  readonly text = input.required<string>();

  protected readonly pieces = computed(() => partFigures(tradeText(this.text(), this.sessions.dialect())));
}
