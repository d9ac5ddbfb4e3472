import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { ApiProblem } from '../http/api-problem';
import { Sign } from '../verdict/sign';

/** Why an act did not go through, in a sentence beside its button. What was typed stays. */
@Component({
  selector: 'ss-problem-line',
  imports: [Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'alert' },
  template: `
    @if (problem(); as failed) {
      <p class="problem">
        <ss-sign [name]="failed.noNetwork ? 'waiting' : 'fail'" />
        <span>{{ failed.sentence }}</span>
      </p>
    }
  `,
  styleUrl: './states.scss',
})
export class ProblemLine {
  readonly problem = input.required<ApiProblem | null>();
}
