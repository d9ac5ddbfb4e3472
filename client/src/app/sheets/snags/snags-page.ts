import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { PageTitle } from '../../layout/page-title';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { EmptyState } from '../../states/empty-state';
import { LoadState } from '../../states/load-state';
import { VerdictLine } from '../../verdict/verdict';
import { When } from '../../words/dates';
import { withoutRule } from '../judged/judged';
import { settlementWords } from '../settlement-words';
import { SheetHead } from '../sheet/sheet-head';
import { SheetStore } from '../sheet-store';
import { SettleForm } from './settle-form';

const causeWords = {
  failed: 'An entry failed',
  disagreement: 'Two people disagree',
  raised: 'Raised',
} as const;

/** The sheet's snags, open ones first, with the form that settles them for who may. */
@Component({
  selector: 'ss-snags-page',
  imports: [EmptyState, LoadState, RouterLink, Sentence, SettleForm, SheetHead, VerdictLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './snags-page.html',
  styleUrl: './snags-page.scss',
})
export class SnagsPage {
  protected readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);

  protected readonly causeWords = causeWords;
  protected readonly settlementWords = settlementWords;
  protected readonly withoutRule = withoutRule;
  protected readonly heading = computed(() => tradeText('{Snags}', this.sessions.dialect()));
  protected readonly open = computed(() => this.all().filter(({ settled }) => settled === null));
  protected readonly settled = computed(() => this.all().filter(({ settled }) => settled !== null));

  private readonly all = computed(() => (this.store.snags.hasValue() ? this.store.snags.value() : []));

  constructor() {
    inject(PageTitle).name(this.heading());
    this.store.openStep(null);
    this.store.openSnags();
  }

  protected say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }

  protected titleOf(code: string): string {
    return this.store.lines().find((line) => line.code === code)?.title ?? '';
  }
}
