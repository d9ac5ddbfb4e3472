import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { WorkingAnswer } from '@second-spanner/shared/workings/working';
import { VerdictLine } from '../../verdict/verdict';

/** Why there is no answer yet: what is still to be typed, or what is to be put right. */
@Component({
  selector: 'ss-not-yet',
  imports: [VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (words of stray(); track words) {
      <ss-verdict of="fail" word="Look again" [sentence]="words" />
    } @empty {
      <ss-verdict of="waiting" word="Not yet" [sentence]="sentence()" />
    }
  `,
})
export class NotYet {
  readonly answer = input.required<WorkingAnswer>();
  /** What is wrong without a field to say it at. */
  readonly stray = input.required<readonly string[]>();

  protected readonly sentence = computed(() => {
    const { errors, missing } = this.answer();
    const wrong =
      Object.keys(errors).length > 0 ? 'Put right what is marked, and the answer stands here.' : null;
    return wrong ?? missing ?? 'There is nothing to say yet.';
  });
}
