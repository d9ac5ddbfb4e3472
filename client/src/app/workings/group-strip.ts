import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { TradeWords } from '../words/trade-words';
import { groups, placeOf } from './groups';

/** The other workings of a group: a strip of links at the desk, a choice on the phone. */
@Component({
  selector: 'ss-group-strip',
  imports: [RouterLink, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'screen-only' },
  template: `
    @if (group(); as group) {
      <nav class="desk-only" [attr.aria-label]="group.name | tradeWords">
        @for (each of group.workings; track each.key) {
          <a
            [routerLink]="placeOf(each)"
            [class.here]="each.key === of()"
            [attr.aria-current]="each.key === of() ? 'page' : null"
            >{{ each.title | tradeWords }}</a
          >
        }
      </nav>
      <label class="phone-only">
        <span class="caption">Working</span>
        <select #choice (change)="goTo(choice.value)">
          @for (each of group.workings; track each.key) {
            <option [value]="each.key" [selected]="each.key === of()">{{ each.title | tradeWords }}</option>
          }
        </select>
      </label>
    }
  `,
  styleUrl: './group-strip.scss',
})
export class GroupStrip {
  private readonly router = inject(Router);

  /** Key of the working that is open. */
  readonly of = input.required<string>();

  protected readonly placeOf = placeOf;
  /** Nothing where a working is alone in its group. */
  protected readonly group = computed(() => {
    const own = workingNamed(this.of())?.group;
    return groups.find(({ key, workings }) => key === own && workings.length > 1) ?? null;
  });

  protected goTo(key: string): void {
    const entry = workingNamed(key);
    if (entry !== undefined) void this.router.navigateByUrl(placeOf(entry));
  }
}
