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
import { arrange, type Columns } from '../../list/arrange';
import { listAddress } from '../../list/list-address';
import { EmptyState } from '../../states/empty-state';
import { LoadState } from '../../states/load-state';
import { stateNames } from '../../words/names';
import { SheetTable } from './sheet-table';

const pageSize = 25;

const columns: Columns<SheetSummary> = {
  code: ({ code }) => code,
  car: ({ carName }) => carName,
  state: ({ state }) => sheetStates.indexOf(state),
  builder: ({ builder }) => builder.name,
  second: ({ countersigner }) => countersigner.name,
  done: ({ stepsDone, stepsTotal }) => stepsDone / Math.max(1, stepsTotal),
  changed: ({ changedAt }) => changedAt,
};

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
  private readonly page = computed(() => (this.sheets.hasValue() ? this.sheets.value() : null));
  protected readonly next = computed(() => this.page()?.next ?? null);
  /** Only a list that stands whole on the page is sorted here: a part of it would only seem to be. */
  protected readonly sort = computed(() => {
    if (this.next() !== null || this.cursor() !== '') return null;
    return this.address.params().get('sort') ?? '-changed';
  });
  protected readonly rows = computed(() => {
    const [items, sort] = [this.page()?.items ?? [], this.sort()];
    return sort === null
      ? items
      : arrange(items, { search: '', sort, page: 1 }, columns, Math.max(1, items.length)).rows;
  });
  protected readonly isFiltered = computed(() => this.state() !== '' || this.car() !== '');

  protected choose(filter: 'state' | 'car', event: Event): void {
    const { value } = event.target as HTMLSelectElement;
    this.address.set({ [filter]: value === '' ? null : value, from: null });
  }
}
