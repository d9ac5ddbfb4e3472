import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import type { SpecEdition } from '@second-spanner/shared/contracts/spec';
import { specRows, specSections } from '@second-spanner/shared/spec/spec-rows';
import { Cell } from '../../layout/cell';
import { PageTitle } from '../../layout/page-title';
import { TitleBlock } from '../../layout/title-block';
import { LoadState } from '../../states/load-state';
import { EmptyState } from '../../states/empty-state';
import { When } from '../../words/dates';
import { TradeWords } from '../../words/trade-words';
import { EditionAside } from './edition-aside';
import { ValueTable } from './value-table';

/** One edition of a spec, read section by section; each section has its own address. */
@Component({
  selector: 'ss-edition-page',
  imports: [Cell, EditionAside, EmptyState, LoadState, RouterLink, TitleBlock, TradeWords, ValueTable, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './edition-page.html',
  styleUrl: './edition-page.scss',
})
export class EditionPage {
  private readonly title = inject(PageTitle);
  private readonly router = inject(Router);

  readonly id = input.required<string>();
  readonly edition = input.required<string>();
  readonly section = input.required<string>();

  protected readonly read = httpResource<SpecEdition>(
    () => `/api/specs/${this.id()}/editions/${this.edition()}`,
  );
  protected readonly spec = computed(() => (this.read.hasValue() ? this.read.value() : null));
  protected readonly allRows = computed(() => {
    const spec = this.spec();
    return spec === null ? [] : specRows(spec.document);
  });
  /** Sections that this spec has something in. */
  protected readonly sections = computed(() =>
    specSections.filter(({ key }) => this.allRows().some(({ section }) => section === key)),
  );
  protected readonly shown = computed(() => specSections.find(({ key }) => key === this.section()));
  protected readonly rows = computed(() =>
    this.allRows().filter(({ section }) => section === this.section()),
  );

  constructor() {
    effect(() => {
      const spec = this.spec();
      if (spec !== null) this.title.name(`${spec.title}, edition ${spec.edition}`);
    });
  }

  protected goTo(event: Event): void {
    const { value } = event.target as HTMLSelectElement;
    void this.router.navigate(['/specs', this.id(), this.edition(), value]);
  }
}
