import { DOCUMENT } from '@angular/common';
import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { saveFile } from '../../http/save-file';
import { Saving } from '../../sheets/saving/save-state';
import { LoadState } from '../../states/load-state';
import { ProblemLine } from '../../states/problem-line';
import { When } from '../../words/dates';
import { TradeWords } from '../../words/trade-words';
import { placeOf } from '../../workings/groups';
import { keptQuery } from '../../workings/kept-case';
import { WorkingsApi } from '../../workings/workings-api';

/** The workings that are kept with a car; each opens with what was typed, and can be had as a PDF. */
@Component({
  selector: 'ss-kept-workings',
  imports: [LoadState, MatButton, ProblemLine, RouterLink, TradeWords, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './kept-workings.html',
  styleUrl: './kept-workings.scss',
})
export class KeptWorkings {
  private readonly document = inject(DOCUMENT);
  private readonly api = inject(WorkingsApi);

  readonly carId = input.required<string>();

  protected readonly read = httpResource<{ readonly items: readonly KeptWorking[] }>(
    () => `/api/cars/${this.carId()}/workings`,
  );
  protected readonly rows = computed(() =>
    (this.read.hasValue() ? this.read.value().items : []).map((kept) => {
      const entry = workingNamed(kept.working);
      return { kept, place: entry === undefined ? null : placeOf(entry), what: entry?.title ?? kept.working };
    }),
  );
  protected readonly query = keptQuery;
  protected readonly making = new Saving();

  protected async makePdf(kept: KeptWorking): Promise<void> {
    const pdf = await this.making.follow(this.api.keptPdf(kept, 'a4'));
    if (pdf !== null) saveFile(this.document, pdf.file, pdf.name);
  }
}
