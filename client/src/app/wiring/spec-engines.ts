import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import type { SpecEdition, SpecSummary } from '@second-spanner/shared/contracts/spec';
import { EMPTY, map, of, shareReplay, type Observable } from 'rxjs';
import { allPages } from '../list/all-pages';
import { SessionStore } from '../session/session-store';
import type { Choice } from './fields/chosen-field';
import { formOfSpec } from '@second-spanner/shared/workings/wiring-map/form-of-spec';
import type { WiringForm } from '@second-spanner/shared/workings/wiring-map/wiring-form';

interface NamedEdition {
  readonly value: string;
  readonly specId: string;
  readonly edition: number;
  readonly words: string;
}

/** How an edition is named in a choice and in the address: `AT18,2`. */
export function editionName(code: string, edition: string | number): string {
  return code === '' ? '' : `${code},${edition}`;
}

/** The engines of the shop's spec book, for those who may read it; for others there are none. */
@Injectable()
export class SpecEngines {
  private readonly http = inject(HttpClient);
  private readonly read = new Map<string, Observable<WiringForm>>();
  readonly mayRead = inject(SessionStore).may('specs.read');

  readonly specs = rxResource({
    stream: () => (this.mayRead ? allPages<SpecSummary>(this.http, '/api/specs') : of([])),
  });
  private readonly editions = computed(() =>
    (this.specs.hasValue() ? this.specs.value() : []).flatMap(editionsOf),
  );
  readonly choices = computed<readonly Choice[]>(() =>
    this.editions().map(({ value, words }) => ({ value, words })),
  );

  /** Whether the spec book has this edition. */
  has(name: string): boolean {
    return this.editions().some(({ value }) => value === name);
  }

  /** The engine of an edition, read once; nothing where there is no such edition. */
  engine(name: string): Observable<WiringForm> {
    const edition = this.editions().find(({ value }) => value === name);
    if (edition === undefined) return EMPTY;
    const known = this.read.get(name);
    if (known !== undefined) return known;
    const url = `/api/specs/${edition.specId}/editions/${edition.edition}`;
    const engine = this.http.get<SpecEdition>(url).pipe(map(formOfSpec), shareReplay(1));
    this.read.set(name, engine);
    return engine;
  }
}

function editionsOf({ id, code, title, editions }: SpecSummary): readonly NamedEdition[] {
  return editions
    .toSorted((a, b) => b.edition - a.edition)
    .map(({ edition, state }) => ({
      value: editionName(code, edition),
      specId: id,
      edition,
      words: `${title}, edition ${edition}${state === 'approved' ? '' : ` (${state})`}`,
    }));
}
