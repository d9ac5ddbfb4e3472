import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import { SheetStore } from '../sheet-store';

/** From a sheet to its history, its snags and its sign-off, and back to all sheets. */
@Component({
  selector: 'ss-sheet-links',
  imports: [MatIcon, RouterLink, RouterLinkActive, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul>
      <li>
        <a [routerLink]="[base(), 'snags']" routerLinkActive="here" ariaCurrentWhenActive="page">
          <ss-sign [name]="snags() > 0 ? 'fail' : 'pass'" />
          {{
            (snags() === 0 ? 'No open {snags}' : snags() === 1 ? '1 open {snag}' : snags() + ' open {snags}')
              | tradeWords
          }}
        </a>
      </li>
      <li>
        <a [routerLink]="[base(), 'history']" routerLinkActive="here" ariaCurrentWhenActive="page">
          <mat-icon svgIcon="history" />History
        </a>
      </li>
      <li>
        <a [routerLink]="[base(), 'sign-off']" routerLinkActive="here" ariaCurrentWhenActive="page">
          <mat-icon svgIcon="pdf" />Sign-off
        </a>
      </li>
      <li>
        <a routerLink="/sheets"><mat-icon svgIcon="back" />All sheets</a>
      </li>
    </ul>
  `,
  styles: `
    :host {
      display: block;
      padding: var(--ss-2) 0;
    }

    a {
      display: flex;
      align-items: center;
      gap: var(--ss-3);
      min-height: 48px;
      padding: 0 20px;
      color: var(--ss-ink);
      text-decoration: none;
    }

    .here {
      font-weight: 500;
      color: var(--ss-blue);
    }

    mat-icon {
      width: 20px;
      height: 20px;
      color: var(--ss-ink-2);
    }

    :focus-visible {
      outline-offset: -3px;
    }

    @media (min-width: 960px) {
      ul {
        display: grid;
        grid-template-columns: 1fr 1fr;
      }

      a {
        gap: var(--ss-2);
        padding: 0 4px 0 20px;
        min-height: 36px;
        font-size: 14px;
      }
    }
  `,
})
export class SheetLinks {
  private readonly store = inject(SheetStore);

  protected readonly base = computed(() => `/sheets/${this.store.id()}`);
  protected readonly snags = computed(() =>
    this.store.sheet.hasValue() ? this.store.sheet.value().openSnags : 0,
  );
}
