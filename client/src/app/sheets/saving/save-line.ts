import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { ApiProblem } from '../../http/api-problem';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { When } from '../../words/dates';
import type { SaveState } from './save-state';

/** Says quietly where a save stands: saving, kept, waiting for the network, or failed with the reason. */
@Component({
  selector: 'ss-save-line',
  imports: [Sentence, Sign, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status' },
  template: `
    @let save = of();
    @switch (save.state) {
      @case ('saving') {
        <p class="small quiet">Saving…</p>
      }
      @case ('kept') {
        <p class="small quiet">
          Kept at <span class="f">{{ save.at | when }}</span>.
        </p>
      }
      @case ('waiting') {
        <p class="small line"><ss-sign name="waiting" />Kept on this device; waiting for the network.</p>
      }
      @case ('failed') {
        <p class="small line">
          <ss-sign [name]="save.problem.noNetwork ? 'waiting' : 'fail'" />
          <ss-sentence [text]="failedWords(save.problem)" />
        </p>
      }
    }
  `,
  styles: `
    .line {
      display: flex;
      gap: var(--ss-2);
      color: var(--ss-ink);
    }
  `,
})
export class SaveLine {
  readonly of = input.required<SaveState>();

  /** What belongs to a field stands there; here it is only said that nothing was kept. */
  protected failedWords(problem: ApiProblem): string {
    return problem.errors.length > 0 ? 'Not kept: see above.' : `Not kept. ${problem.sentence}`;
  }
}
