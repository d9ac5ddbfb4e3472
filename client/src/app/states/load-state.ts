import { ChangeDetectionStrategy, Component, computed, input, type Resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { toApiProblem } from '../http/api-problem';
import { Sign } from '../verdict/sign';

type Reloadable = Pick<Resource<unknown>, 'isLoading' | 'error' | 'hasValue'> & { reload(): boolean };

/**
 * What stands in a page's place while its thing is being read, or could not be: loading, error with another
 * try, or no network. Shows nothing once there is something to show.
 */
@Component({
  selector: 'ss-load-state',
  imports: [MatButton, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (problem(); as failed) {
      <div class="state" role="alert">
        <ss-sign [name]="failed.noNetwork ? 'waiting' : 'fail'" />
        <div>
          <h2>{{ failed.noNetwork ? 'No network' : 'Could not read ' + what() }}</h2>
          <p>{{ failed.sentence }}</p>
          <button matButton="outlined" type="button" (click)="from().reload()">Try again</button>
        </div>
      </div>
    } @else if (from().isLoading() && !from().hasValue()) {
      <p class="loading" role="status">Reading {{ what() }}…</p>
    }
  `,
  styleUrl: './states.scss',
})
export class LoadState {
  readonly from = input.required<Reloadable>();
  /** What is read, for the sentence: `the car files`. */
  readonly what = input.required<string>();

  protected readonly problem = computed(() => {
    const error = this.from().error();
    return error === undefined ? null : toApiProblem(error);
  });
}
