import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { TitleBlock } from '../layout/title-block';
import { EmptyState } from '../states/empty-state';

@Component({
  selector: 'ss-not-found',
  imports: [EmptyState, MatButton, RouterLink, TitleBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-title-block caption="No such page" heading="Nothing here" />
    <div class="sheet">
      <ss-empty-state
        heading="There is no page under this address"
        sentence="It may have been typed wrongly, or the thing it showed is not yours to see."
      >
        <a matButton="filled" routerLink="/">Go to the bench</a>
      </ss-empty-state>
    </div>
  `,
})
export class NotFoundPage {}
