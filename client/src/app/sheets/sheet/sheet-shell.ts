import { ChangeDetectionStrategy, Component, effect, inject, input } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { FrameAside } from '../../layout/frame-aside';
import { Sign } from '../../verdict/sign';
import { SheetStore } from '../sheet-store';
import { SheetLinks } from './sheet-links';
import { StageList } from './stage-list';

/** Around every page of one sheet: keeps the sheet at hand, and on the desk its stages in the left column. */
@Component({
  selector: 'ss-sheet-shell',
  imports: [FrameAside, RouterOutlet, SheetLinks, Sign, StageList],
  providers: [SheetStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ng-template ssFrameAside>
      <div class="aside">
        <nav aria-label="Stages and steps">
          <ss-stage-list />
          <p class="small key"><ss-sign name="hold" />hold point: a second person countersigns</p>
        </nav>
        <nav class="links" aria-label="This sheet"><ss-sheet-links /></nav>
      </div>
    </ng-template>
    <router-outlet />
  `,
  styles: `
    :host {
      display: flex;
      flex-direction: column;
      flex: 1;
    }

    :host ::ng-deep > router-outlet + * {
      display: flex;
      flex-direction: column;
      flex: 1;
      min-width: 0;
    }

    .aside {
      display: flex;
      flex-direction: column;
      width: 286px;
      min-height: 100%;
    }

    nav {
      padding-top: var(--ss-2);
    }

    .links {
      margin-top: auto;
    }

    .key {
      display: flex;
      gap: var(--ss-3);
      padding: var(--ss-2) 20px 14px;
      color: var(--ss-ink-2);
    }
  `,
})
export class SheetShell {
  private readonly store = inject(SheetStore);

  /** From the address. */
  readonly id = input.required<string>();

  constructor() {
    effect(() => this.store.open(this.id()));
  }
}
