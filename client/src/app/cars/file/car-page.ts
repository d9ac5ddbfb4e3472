import { NgComponentOutlet } from '@angular/common';
import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import type { CarFile } from '@second-spanner/shared/contracts/car-files';
import { Cell } from '../../layout/cell';
import { PageTitle } from '../../layout/page-title';
import { TitleBlock } from '../../layout/title-block';
import { SessionStore } from '../../session/session-store';
import { SheetTable } from '../../sheets/list/sheet-table';
import { EmptyState } from '../../states/empty-state';
import { laterPart, type LoadPart } from '../../states/later-part';
import { LoadState } from '../../states/load-state';
import { KeptWorkings } from '../kept/kept-workings';

const loadStart: LoadPart = async () => (await import('../start/start-sheet')).StartSheet;

/** One car: its details, its owner, its sheets, a new sheet for whoever may start one, its workings. */
@Component({
  selector: 'ss-car-page',
  imports: [Cell, EmptyState, KeptWorkings, LoadState, NgComponentOutlet, SheetTable, TitleBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './car-page.html',
  styleUrl: './car-page.scss',
})
export class CarPage {
  private readonly title = inject(PageTitle);

  readonly id = input.required<string>();

  protected readonly car = httpResource<CarFile>(() => `/api/cars/${this.id()}`);
  protected readonly file = computed(() => (this.car.hasValue() ? this.car.value() : null));
  protected readonly mayStart = inject(SessionStore).may('sheets.start');
  /** Starting a sheet needs the network anyway. */
  protected readonly start = laterPart(
    () => (this.mayStart ? loadStart : undefined),
    'No network. A sheet is started where there is one.',
  );

  constructor() {
    effect(() => {
      const file = this.file();
      if (file !== null) this.title.name(file.name);
    });
  }
}
