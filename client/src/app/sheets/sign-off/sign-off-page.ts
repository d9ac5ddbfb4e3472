import { ChangeDetectionStrategy, Component, computed, inject, viewChild } from '@angular/core';
import { RouterLink } from '@angular/router';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { maySendBack } from '@second-spanner/shared/sheet/sheet-states';
import { signatureWords, stepStatusWords } from '@second-spanner/shared/sheet/words';
import { PageTitle } from '../../layout/page-title';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { LoadState } from '../../states/load-state';
import { Sign } from '../../verdict/sign';
import { VerdictLine } from '../../verdict/verdict';
import { When } from '../../words/dates';
import { Saving } from '../saving/save-state';
import { SayWhy } from '../say-why/say-why';
import { SheetApi } from '../sheet-api';
import { SheetHead } from '../sheet/sheet-head';
import { SheetStore } from '../sheet-store';
import { BuildSheetDownload } from './build-sheet-download';
import { SignForm } from './sign-form';

const shownMissing = 12;

/** What a sheet still lacks, who has signed it, and the signing itself. */
@Component({
  selector: 'ss-sign-off-page',
  imports: [
    BuildSheetDownload,
    LoadState,
    RouterLink,
    SayWhy,
    Sentence,
    SheetHead,
    Sign,
    SignForm,
    VerdictLine,
    When,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sign-off-page.html',
  styleUrl: './sign-off-page.scss',
})
export class SignOffPage {
  private readonly api = inject(SheetApi);
  private readonly sessions = inject(SessionStore);
  protected readonly store = inject(SheetStore);
  private readonly back = viewChild<SayWhy>('back');

  protected readonly sendingBack = new Saving();
  protected readonly meanings = signatureWords;
  protected readonly statusWords = stepStatusWords;
  protected readonly sheet = computed(() => (this.store.sheet.hasValue() ? this.store.sheet.value() : null));
  private readonly missing = computed(() => this.store.lines().filter(({ status }) => status !== 'done'));
  protected readonly shown = computed(() => this.missing().slice(0, shownMissing));
  protected readonly missingWords = computed(() => {
    const count = this.missing().length;
    if (count === 0) return null;
    return count === 1 ? '1 step is not done.' : `${count} steps are not done.`;
  });
  protected readonly more = computed(() => this.missing().length - this.shown().length);
  protected readonly signers = computed(() => {
    const sheet = this.sheet();
    if (sheet === null) return [];
    return (['built', 'countersigned', 'released'] as const).map((meaning) => ({
      meaning,
      signature: sheet.signatures.find((signature) => signature.meaning === meaning) ?? null,
      expected:
        meaning === 'built'
          ? sheet.builder.name
          : meaning === 'countersigned'
            ? sheet.countersigner.name
            : 'the foreman',
    }));
  });
  protected readonly maySendBack = computed(() => {
    const sheet = this.sheet();
    return sheet !== null && maySendBack(sheet.state) && this.sessions.may('sheets.send-back');
  });
  protected readonly mayReadPdf = computed(() => this.sessions.may('build-sheets.read'));

  constructor() {
    inject(PageTitle).name('Sign-off');
    this.store.openStep(null);
  }

  protected say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }

  protected async sendBack(reason: string): Promise<void> {
    const sheet = await this.sendingBack.follow(this.api.sendBack(this.store.id(), { reason }));
    if (sheet === null) return;
    this.back()?.done();
    this.store.takeSheet(sheet);
  }
}
