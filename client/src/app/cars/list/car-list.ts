import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { RouterLink } from '@angular/router';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import { Cell } from '../../layout/cell';
import { TitleBlock } from '../../layout/title-block';
import { allPages } from '../../list/all-pages';
import { arrange, type Columns } from '../../list/arrange';
import { listAddress } from '../../list/list-address';
import { Pager } from '../../list/pager';
import { SearchField } from '../../list/search-field';
import { SortHead } from '../../list/sort-head';
import { EmptyState } from '../../states/empty-state';
import { LoadState } from '../../states/load-state';

const pageSize = 25;

const columns: Columns<CarSummary> = {
  code: ({ code }) => code,
  name: ({ name }) => name,
  year: ({ year }) => year,
  engine: ({ engineCode }) => engineCode,
  number: ({ engineNumber }) => engineNumber,
  owner: ({ ownerName }) => ownerName ?? '',
  sheets: ({ sheetCount }) => sheetCount,
};

/** The shop's cars; a car owner's own. */
@Component({
  selector: 'ss-car-list',
  imports: [Cell, EmptyState, LoadState, Pager, RouterLink, SearchField, SortHead, TitleBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './car-list.html',
})
export class CarList {
  private readonly http = inject(HttpClient);
  protected readonly address = listAddress('cars');

  protected readonly cars = rxResource({ stream: () => allPages<CarSummary>(this.http, '/api/cars') });
  protected readonly search = computed(() => this.address.params().get('q') ?? '');
  protected readonly sort = computed(() => this.address.params().get('sort') ?? '');
  protected readonly all = computed(() => (this.cars.hasValue() ? this.cars.value() : []));
  protected readonly shown = computed(() => {
    const page = Number(this.address.params().get('page') ?? 1);
    return arrange(this.all(), { search: this.search(), sort: this.sort(), page }, columns, pageSize);
  });

  protected lookFor(text: string): void {
    this.address.set({ q: text === '' ? null : text, page: null });
  }

  protected sortBy(sort: string): void {
    this.address.set({ sort, page: null });
  }

  protected turnTo(page: number): void {
    this.address.set({ page });
  }
}
