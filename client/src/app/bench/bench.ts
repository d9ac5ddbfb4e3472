import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import { Cell } from '../layout/cell';
import { TitleBlock } from '../layout/title-block';
import { ProgressRule } from '../progress-rule/progress-rule';
import { Sentence } from '../quantity/sentence';
import { SessionStore } from '../session/session-store';
import { EmptyState } from '../states/empty-state';
import { LoadState } from '../states/load-state';
import { VerdictLine } from '../verdict/verdict';
import { When } from '../words/dates';
import { roleNames, stateNames } from '../words/names';
import { TradeWords } from '../words/trade-words';
import { BenchStore } from './bench-store';
import { BenchDrawing } from './bench-drawing';
import { benchLink, benchWords, hasDrawing } from './bench-words';

const today = new Intl.DateTimeFormat('en-GB', { weekday: 'long', day: 'numeric', month: 'long' });

/** A person's first page: what waits for them now, and what is on the stand. */
@Component({
  selector: 'ss-bench',
  imports: [
    BenchDrawing,
    Cell,
    EmptyState,
    LoadState,
    MatButton,
    ProgressRule,
    RouterLink,
    Sentence,
    TitleBlock,
    TradeWords,
    VerdictLine,
    When,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './bench.html',
  styleUrl: './bench.scss',
})
export class BenchPage {
  private readonly sessions = inject(SessionStore);
  protected readonly bench = inject(BenchStore).bench;

  protected readonly caption = `Bench, ${today.format(new Date()).replace(',', '')}`;
  protected readonly heading = computed(
    () => `What waits for ${this.sessions.person()?.name.split(' ')[0] ?? 'you'}`,
  );
  protected readonly shop = computed(() => this.sessions.shop()?.name ?? '');
  protected readonly person = computed(() => {
    const person = this.sessions.person();
    return person === null ? '' : `${person.name}, ${roleNames[person.role]}`;
  });
  /** Where there is room beside the words. */
  private readonly isWide = matchMedia('(min-width: 1200px)').matches;
  protected readonly items = computed(() =>
    this.bench.hasValue()
      ? this.bench.value().items.map((item) => ({
          ...item,
          // The rule of a judgement is read on the step's own page.
          sentence: item.sentence.split(' Rule: ')[0] ?? '',
          words: benchWords(item),
          link: benchLink(item),
          isDrawn: this.isWide && hasDrawing(item),
        }))
      : [],
  );
  protected readonly onTheStand = computed(() =>
    this.bench.hasValue() ? this.bench.value().onTheStand : [],
  );

  constructor() {
    // The navigation's count may have read it long ago.
    if (this.bench.hasValue()) this.bench.reload();
  }

  protected about(sheet: SheetSummary): string {
    return sheet.state === 'on-the-stand'
      ? `${sheet.builder.name} builds, ${sheet.countersigner.name} checks`
      : stateNames[sheet.state];
  }
}
