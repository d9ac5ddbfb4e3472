import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  signal,
  untracked,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { HistoryLine } from '@second-spanner/shared/contracts/sheets';
import { firstValueFrom } from 'rxjs';
import { toApiProblem, type ApiProblem } from '../../http/api-problem';
import { PageTitle } from '../../layout/page-title';
import { Sentence } from '../../quantity/sentence';
import { EmptyState } from '../../states/empty-state';
import { ProblemLine } from '../../states/problem-line';
import { VerdictLine } from '../../verdict/verdict';
import { When } from '../../words/dates';
import { SheetHead } from '../sheet/sheet-head';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';

/** Everything that was done on a sheet, newest first; older lines are read on request. */
@Component({
  selector: 'ss-history-page',
  imports: [EmptyState, MatButton, ProblemLine, RouterLink, Sentence, SheetHead, VerdictLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './history-page.html',
  styleUrl: './history-page.scss',
})
export class HistoryPage {
  private readonly api = inject(SheetApi);
  protected readonly store = inject(SheetStore);

  protected readonly lines = signal<readonly HistoryLine[]>([]);
  protected readonly next = signal<string | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly isReading = signal(true);
  protected readonly isRead = signal(false);

  private readonly version = computed(() =>
    this.store.sheet.hasValue() ? this.store.sheet.value().version : null,
  );

  constructor() {
    inject(PageTitle).name('History');
    this.store.openStep(null);
    effect(() => {
      // Read anew whenever the sheet changed.
      if (this.version() !== null) untracked(() => void this.readNewest());
    });
  }

  protected async readNewest(): Promise<void> {
    const page = await this.read(null);
    if (page === null) return;
    // What was read of older lines stays; the newest come before them.
    const known = new Set(page.items.map(({ seq }) => seq));
    const older = this.isRead() ? this.lines().filter(({ seq }) => !known.has(seq)) : [];
    this.lines.set([...page.items, ...older]);
    if (!this.isRead()) this.next.set(page.next);
    this.isRead.set(true);
  }

  protected async readOlder(): Promise<void> {
    const page = await this.read(this.next());
    if (page === null) return;
    const known = new Set(this.lines().map(({ seq }) => seq));
    this.lines.update((lines) => [...lines, ...page.items.filter(({ seq }) => !known.has(seq))]);
    this.next.set(page.next);
  }

  private async read(cursor: string | null) {
    this.isReading.set(true);
    try {
      const page = await firstValueFrom(this.api.history(this.store.id(), cursor));
      this.problem.set(null);
      return page;
    } catch (error) {
      this.problem.set(toApiProblem(error));
      return null;
    } finally {
      this.isReading.set(false);
    }
  }
}
