import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { TitleBlock } from '../../layout/title-block';
import { Sentence } from '../../quantity/sentence';
import { TradeWords } from '../../words/trade-words';
import { groups, placeOf } from '../groups';

/** Every working by its group, each with the question that it answers. */
@Component({
  selector: 'ss-workings-page',
  imports: [RouterLink, Sentence, TitleBlock, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-title-block caption="Calculations without a sheet" heading="Workings" />
    <div class="groups">
      @for (group of groups; track group.key) {
        <section [attr.aria-labelledby]="group.key">
          <h2 [id]="group.key">{{ group.name | tradeWords }}</h2>
          <ul>
            @for (working of group.workings; track working.key) {
              <li>
                <a [routerLink]="placeOf(working)">{{ working.title | tradeWords }}</a>
                <p class="quiet"><ss-sentence [text]="working.asks" /></p>
              </li>
            }
          </ul>
        </section>
      }
    </div>
  `,
  styleUrl: './workings-page.scss',
})
export class WorkingsPage {
  protected readonly groups = groups;
  protected readonly placeOf = placeOf;
}
