import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { WaitingTray } from '../../offline/waiting-tray';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { VerdictLine } from '../../verdict/verdict';
import { When } from '../../words/dates';
import { TradeWords } from '../../words/trade-words';
import { entryWords } from '../entry-words';
import { withoutRule } from '../judged/judged';
import type { ShownStep } from '../shown-step';
import { StepWork } from '../step-work';

const shownAtFirst = 12;

/** A step's entries, newest first: corrections beside what they replaced, and what lies in the tray. */
@Component({
  selector: 'ss-entry-list',
  imports: [MatButton, Sentence, Sign, TradeWords, VerdictLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './entry-list.html',
  styleUrl: './entry-list.scss',
})
export class EntryList {
  private readonly tray = inject(WaitingTray);
  protected readonly work = inject(StepWork);

  readonly step = input.required<ShownStep>();

  protected readonly withoutRule = withoutRule;
  protected readonly showAll = signal(false);
  private readonly all = computed(() => {
    const { definition, entries } = this.step();
    const words = new Map(entries.map((entry) => [entry.id, entryWords(definition, entry.content)]));
    return entries
      .map((entry) => ({
        ...entry,
        words: words.get(entry.id) ?? '',
        before: entry.replaces === null ? null : (words.get(entry.replaces) ?? null),
      }))
      .reverse();
  });
  protected readonly shown = computed(() =>
    this.showAll() ? this.all() : this.all().slice(0, shownAtFirst),
  );
  protected readonly hidden = computed(() => this.all().length - this.shown().length);

  protected takeOut(seq: number, words: string): void {
    if (confirm(`Take “${words}” out of the waiting tray for good? It is recorded nowhere else.`)) {
      void this.tray.remove(seq);
    }
  }
}
