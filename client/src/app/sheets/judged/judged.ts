import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import { Sentence } from '../../quantity/sentence';
import { VerdictLine } from '../../verdict/verdict';

const ruleMark = ' Rule: ';

/** A judgement's sentence without the rule behind it, for lists. */
export const withoutRule = (reason: string): string => reason.split(ruleMark)[0] ?? reason;

/** A judgement at the stand: sign, word and sentence; the rule behind it is a touch away. */
@Component({
  selector: 'ss-judged',
  imports: [Sentence, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-verdict [of]="of().verdict" [sentence]="parts().sentence" />
    @if (parts().rule; as rule) {
      <details class="small quiet">
        <summary>The rule</summary>
        <ss-sentence [text]="rule" />
      </details>
    }
  `,
  styles: `
    :host {
      display: block;
    }

    summary {
      padding: var(--ss-1) 0;
      cursor: pointer;
    }
  `,
})
export class Judged {
  readonly of = input.required<Judgement>();

  protected readonly parts = computed(() => {
    const [sentence = '', rule = null] = this.of().reason.split(ruleMark);
    return { sentence, rule };
  });
}
