import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Sentence } from '../../quantity/sentence';
import { TradeWords } from '../../words/trade-words';
import { engineFacts } from '@second-spanner/shared/workings/wiring-map/fact-words';
import type { WiringForm } from '@second-spanner/shared/workings/wiring-map/wiring-form';
import type { WiringAnswer } from '@second-spanner/shared/workings/wiring-map/work-out';

/** What the engine has, to be read: while its fields are closed, and on paper. */
@Component({
  selector: 'ss-engine-facts',
  imports: [Sentence, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (fact of facts(); track fact.caption) {
        <div>
          <dt>{{ fact.caption | tradeWords }}</dt>
          <dd><ss-sentence [text]="fact.words" /></dd>
        </div>
      }
    </dl>
    @if (form().outlets === 'traced') {
      <div class="trace">
        <h3>{{ 'Cap traced, post to {outlet}' | tradeWords }}</h3>
        <ul>
          @for (post of answer().posts; track post.key) {
            <li class="f">
              <span>{{ post.key }}°<span class="visually-hidden"> to </span></span
              >{{ form().trace[post.key] }}
            </li>
          }
        </ul>
      </div>
    }
  `,
  styleUrl: './engine-facts.scss',
})
export class EngineFacts {
  readonly form = input.required<WiringForm>();
  readonly answer = input.required<WiringAnswer>();

  protected readonly facts = computed(() => engineFacts(this.form(), this.answer()));
}
