import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** An empty page says what to do next; the act, where there is one, is projected. */
@Component({
  selector: 'ss-empty-state',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="state">
      <div>
        <h2>{{ heading() }}</h2>
        <p>{{ sentence() }}</p>
        <ng-content />
      </div>
    </div>
  `,
  styleUrl: './states.scss',
})
export class EmptyState {
  readonly heading = input.required<string>();
  readonly sentence = input.required<string>();
}
