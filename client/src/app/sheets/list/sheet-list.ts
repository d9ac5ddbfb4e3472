import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { Page } from '@second-spanner/shared/contracts/paging';
import { sheetStates, type SheetSummary } from '@second-spanner/shared/contracts/sheets';
import { Cell } from '../../layout/cell';
import { TitleBlock } from '../../layout/title-block';
import { allPages } from '../../list/all-pages';
import { listAddress } from '../../list/list-address';
import { EmptyState } from '../../states/empty-state';
import { LoadState } from '../../states/load-state';
import { stateNames } from '../../words/names';
import { SheetTable } from './sheet-table';

const pageSize = 25;

/** The shop's sheets, those changed last first; by state and by car. */
@Component({
  selector: 'ss-sheet-list',
  imports: [Cell, EmptyState, LoadState, MatButton, RouterLink, SheetTable, TitleBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sheet-list.html',
  styleUrl: './sheet-list.scss',
})
export class SheetList {
  private readonly http = inject(HttpClient);
  protected readonly address = listAddress('sheets');

  protected readonly states = sheetStates;
  protected readonly stateNames = stateNames;
  protected readonly state = computed(() => this.address.params().get('state') ?? '');
  protected readonly stateName = computed(() => {
    const state = sheetStates.find((each) => each === this.state());
    return state === undefined ? 'every state' : stateNames[state];
  });
  protected readonly car = computed(() => this.address.params().get('car') ?? '');
  protected readonly cursor = computed(() => this.address.params().get('from') ?? '');

  protected readonly cars = rxResource({ stream: () => allPages<CarSummary>(this.http, '/api/cars') });
  protected readonly sheets = httpResource<Page<SheetSummary>>(() => ({
    url: '/api/sheets',
    params: {
      limit: pageSize,
      ...(this.state() === '' ? {} : { state: this.state() }),
      ...(this.car() === '' ? {} : { car: this.car() }),
      ...(this.cursor() === '' ? {} : { cursor: this.cursor() }),
    },
  }));
  protected readonly rows = computed(() => (this.sheets.hasValue() ? this.sheets.value().items : []));
  protected readonly next = computed(() => (this.sheets.hasValue() ? this.sheets.value().next : null));
  protected readonly isFiltered = computed(() => this.state() !== '' || this.car() !== '');

  protected choose(filter: 'state' | 'car', event: Event): void {
    const { value } = event.target as HTMLSelectElement;
    this.address.set({ [filter]: value === '' ? null : value, from: null });
  }
}
