import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';
import { Sentence } from '../quantity/sentence';
import { Sign } from './sign';
import { signOf, signWords, type SignName } from './signs';

/** A verdict as it always stands: sign, word, and a sentence with the numbers where there is one. */
@Component({
  selector: 'ss-verdict',
  imports: [Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class]': 'sign()' },
  template: `
    <span class="word"><ss-sign [name]="sign()" />{{ word() ?? standard() }}</span>
    @if (sentence(); as text) {
      <ss-sentence [text]="text" />
    }
  `,
  styleUrl: './verdict.scss',
})
export class VerdictLine {
  readonly of = input.required<Verdict | SignName>();
  readonly sentence = input<string | null>(null);
  /** Another word beside the sign, such as Agree. */
  readonly word = input<string | null>(null);

  protected readonly sign = computed<SignName>(() => {
    const verdict = this.of();
    return verdict === 'waiting' || verdict === 'hold' ? verdict : signOf(verdict);
  });
  protected readonly standard = computed(() => signWords[this.sign()]);
}
