import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { RouterLink } from '@angular/router';
import type { SpecSummary } from '@second-spanner/shared/contracts/spec';
import { Cell } from '../../layout/cell';
import { TitleBlock } from '../../layout/title-block';
import { allPages } from '../../list/all-pages';
import { EmptyState } from '../../states/empty-state';
import { LoadState } from '../../states/load-state';
import { When } from '../../words/dates';

/** The shop's engine specs, each with its editions, the newest first. */
@Component({
  selector: 'ss-spec-list',
  imports: [Cell, EmptyState, LoadState, RouterLink, TitleBlock, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './spec-list.html',
  styleUrl: './spec-list.scss',
})
export class SpecList {
  private readonly http = inject(HttpClient);

  protected readonly specs = rxResource({ stream: () => allPages<SpecSummary>(this.http, '/api/specs') });
  protected readonly all = computed(() =>
    (this.specs.hasValue() ? this.specs.value() : []).map((spec) => ({
      ...spec,
      editions: spec.editions.toSorted((a, b) => b.edition - a.edition),
    })),
  );
}
