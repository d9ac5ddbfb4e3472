import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import type { FormPost } from '@second-spanner/shared/workings/wiring-map/cap-of-form';

/** The cap traced, post to outlet: posts by angle, outlets by letter. */
@Component({
  selector: 'ss-trace-fields',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset>
      <legend>{{ 'Cap traced, post to {outlet}' | tradeWords }}</legend>
      <p class="small quiet">
        {{ '{Outlets} by letter, down the left side first, then down the right.' | tradeWords }}
      </p>
      <div class="cells">
        @for (post of posts(); track post.key) {
          <label>
            <span class="f">{{ post.key }}°</span>
            <select #outlet class="f" (change)="lead(post.key, outlet.value)">
              <option value="" [selected]="!trace()[post.key]">–</option>
              @for (name of outlets(); track name) {
                <option [value]="name" [selected]="trace()[post.key] === name">{{ name }}</option>
              }
            </select>
          </label>
        }
      </div>
      <p class="error" aria-live="polite">
        @if (error(); as words) {
          <ss-sign name="fail" /><ss-sentence [text]="words" />
        }
      </p>
    </fieldset>
  `,
  styleUrl: './cells.scss',
})
export class TraceFields {
  readonly posts = input.required<readonly FormPost[]>();
  readonly outlets = input.required<readonly string[]>();
  readonly trace = input.required<Readonly<Record<string, string>>>();
  readonly error = input<string | undefined>();
  readonly traced = output<Readonly<Record<string, string>>>();

  protected lead(post: string, outlet: string): void {
    this.traced.emit({ ...this.trace(), [post]: outlet });
  }
}
