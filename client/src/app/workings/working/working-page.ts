import { ChangeDetectionStrategy, Component, computed, effect, inject, input, resource } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { ApiProblem } from '../../http/api-problem';
import { PageTitle } from '../../layout/page-title';
import { TitleBlock } from '../../layout/title-block';
import { SessionStore } from '../../session/session-store';
import { LoadState } from '../../states/load-state';
import { WorkingDesk } from './working-desk';

/** Any working of the list, loaded when it is opened. */
@Component({
  selector: 'ss-working-page',
  imports: [LoadState, TitleBlock, WorkingDesk],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (working.hasValue() && working.value(); as working) {
      @for (each of [working]; track each.key) {
        <ss-working-desk [working]="each" />
      }
    } @else {
      <ss-title-block caption="Workings, no sheet" back="/workings" [heading]="title()" />
      <div class="sheet"><ss-load-state what="the working" [from]="working" /></div>
    }
  `,
})
export class WorkingPage {
  private readonly dialect = inject(SessionStore).dialect;

  readonly key = input.required<string>();

  protected readonly title = computed(() => tradeText(workingNamed(this.key())?.title ?? '', this.dialect()));
  protected readonly working = resource({
    params: () => this.key(),
    loader: async ({ params }) => {
      try {
        return await workingNamed(params)?.load();
      } catch {
        throw new ApiProblem(0, 'No network. This working has not been opened on this device before.');
      }
    },
  });

  constructor() {
    const pageTitle = inject(PageTitle);
    effect(() => pageTitle.name(this.title()));
  }
}
