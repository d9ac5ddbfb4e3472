import { ChangeDetectionStrategy, Component, computed, effect, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { Foot } from '../../foot/foot';
import { ProgressRule } from '../../progress-rule/progress-rule';
import { SessionStore } from '../../session/session-store';
import { LoadState } from '../../states/load-state';
import { stateNames } from '../../words/names';
import { SaveLine } from '../saving/save-line';
import { Saving } from '../saving/save-state';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';
import { Wide } from '../wide';
import { SheetHead } from './sheet-head';
import { SheetLinks } from './sheet-links';
import { StageList } from './stage-list';
import { stepToOpen } from './stage-progress';

/** A sheet as it is opened: on the phone its stages with their progress; the desk goes on to the step at hand. */
@Component({
  selector: 'ss-sheet-start',
  imports: [Foot, LoadState, MatButton, ProgressRule, RouterLink, SaveLine, SheetHead, SheetLinks, StageList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sheet-start.html',
  styles: `
    .page {
      display: grid;
      gap: var(--ss-2);
      padding: var(--ss-4);
      border-bottom: var(--ss-hair) solid var(--ss-rule);
    }

    h1 {
      font: var(--ss-t-h2);
    }

    nav {
      border-bottom: var(--ss-hair) solid var(--ss-rule);
    }

    ss-load-state {
      padding: 0 var(--ss-4);
    }
  `,
})
export class SheetStart {
  private readonly api = inject(SheetApi);
  private readonly router = inject(Router);
  private readonly sessions = inject(SessionStore);
  protected readonly isDesk = inject(Wide).isDesk;
  protected readonly store = inject(SheetStore);

  protected readonly saving = new Saving();
  protected readonly sheet = computed(() => (this.store.sheet.hasValue() ? this.store.sheet.value() : null));
  protected readonly mayStart = computed(() => this.sessions.may('sheets.start'));
  protected readonly toOpen = computed(() => {
    const sheet = this.sheet();
    if (sheet === null) return null;
    const code = stepToOpen(sheet.nextStep, sheet.stages);
    return this.store.lines().find((line) => line.code === code) ?? null;
  });
  /** The desk goes on at once, but for a sheet that is to be put on the stand. */
  private readonly goesOn = computed(() => {
    const sheet = this.sheet();
    return sheet !== null && this.isDesk() && !(sheet.state === 'planned' && this.mayStart());
  });
  protected readonly shown = computed(() => (this.goesOn() ? null : this.sheet()));
  protected readonly cells = computed(() => {
    const sheet = this.sheet();
    if (sheet === null) return [];
    return [
      { caption: 'Sheet', value: sheet.code, figures: true },
      { caption: 'Steps done', value: `${sheet.stepsDone} of ${sheet.stepsTotal}` },
      { caption: 'State', value: stateNames[sheet.state] },
    ];
  });

  constructor() {
    this.store.openStep(null);
    effect(() => {
      const sheet = this.sheet();
      if (sheet === null || !this.goesOn()) return;
      const step = this.toOpen();
      const page = step === null ? ['sign-off'] : ['steps', step.code];
      void this.router.navigate(['/sheets', sheet.id, ...page], { replaceUrl: true });
    });
  }

  protected async start(): Promise<void> {
    const sheet = await this.saving.follow(this.api.start(this.store.id()));
    if (sheet !== null) this.store.takeSheet(sheet);
  }
}
