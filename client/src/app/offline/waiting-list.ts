import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Network } from '../http/network';
import { Sentence } from '../quantity/sentence';
import { VerdictLine } from '../verdict/verdict';
import { When } from '../words/dates';
import type { TrayItem } from './tray-item';
import { WaitingTray } from './waiting-tray';

/** The waiting tray laid open: what waits for the network, and what was not taken and why. */
@Component({
  selector: 'ss-waiting-list',
  imports: [MatButton, RouterLink, Sentence, VerdictLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (item of tray.items(); track item.seq) {
      <article>
        <p class="small quiet">
          <a [routerLink]="['/sheets', item.sheetId, 'steps', item.stepCode]">
            Sheet <span class="f">{{ item.sheetCode }}</span>, step <span class="f">{{ item.stepCode }}</span>
          </a>
          kept <span class="f">{{ item.keptAt | when }}</span>
        </p>
        <p><ss-sentence [text]="item.words" /></p>
        @if (item.refused; as sentence) {
          <ss-verdict of="fail" word="Not taken" [sentence]="sentence" />
          <a matButton [routerLink]="['/sheets', item.sheetId, 'steps', item.stepCode]"
            >Put it right on the step</a
          >
          <button matButton type="button" (click)="takeOut(item)">Take it out</button>
        } @else {
          <ss-verdict
            of="waiting"
            [sentence]="reachable() ? 'It is sent in its turn.' : 'It is sent when the network is back.'"
          />
        }
      </article>
    } @empty {
      <p class="quiet">Nothing waits in the tray: everything you recorded is kept by the shop.</p>
    }
    @if (tray.count() > 0) {
      <button matButton="outlined" type="button" (click)="tray.sendAll()">Try to send now</button>
    }
  `,
  styles: `
    article {
      padding: var(--ss-2) 0;
      border-bottom: var(--ss-hair) solid var(--ss-rule);
    }

    button[matButton='outlined'] {
      margin-top: var(--ss-3);
    }
  `,
})
export class WaitingList {
  protected readonly tray = inject(WaitingTray);
  protected readonly reachable = inject(Network).reachable;

  protected takeOut(item: TrayItem): void {
    if (confirm(`Take “${item.words}” out of the waiting tray for good? It is recorded nowhere else.`)) {
      void this.tray.remove(item.seq);
    }
  }
}
