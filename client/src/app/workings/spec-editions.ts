import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import type { SpecEdition, SpecSummary } from '@second-spanner/shared/contracts/spec';
import { EMPTY, of, shareReplay, type Observable } from 'rxjs';
import { allPages } from '../list/all-pages';
import { SessionStore } from '../session/session-store';

export interface NamedEdition {
  /** How it is named in a choice: `AT18,2`. */
  readonly value: string;
  readonly words: string;
  readonly state: SpecSummary['editions'][number]['state'];
  readonly specId: string;
  readonly edition: number;
}

/** How an edition is named in a choice and in the address: `AT18,2`. */
export function editionName(code: string, edition: string | number): string {
  return code === '' ? '' : `${code},${edition}`;
}

/** The editions of the shop's spec book, newest first, for those who may read it; for others there are none. */
@Injectable()
export class SpecEditions {
  private readonly http = inject(HttpClient);
  private readonly known = new Map<string, Observable<SpecEdition>>();
  readonly mayRead = inject(SessionStore).may('specs.read');

  readonly specs = rxResource({
    stream: () => (this.mayRead ? allPages<SpecSummary>(this.http, '/api/specs') : of([])),
  });
  readonly all = computed(() => (this.specs.hasValue() ? this.specs.value() : []).flatMap(editionsOf));

  /** Whether the spec book has this edition. */
  has(name: string): boolean {
    return this.all().some(({ value }) => value === name);
  }

  /** An edition, read once; nothing where there is no such edition. */
  read(name: string): Observable<SpecEdition> {
    const edition = this.all().find(({ value }) => value === name);
    if (edition === undefined) return EMPTY;
    const known = this.known.get(name);
    if (known !== undefined) return known;
    const url = `/api/specs/${edition.specId}/editions/${edition.edition}`;
    const read = this.http.get<SpecEdition>(url).pipe(shareReplay(1));
    this.known.set(name, read);
    return read;
  }
}

function editionsOf({ id, code, title, editions }: SpecSummary): readonly NamedEdition[] {
  return editions
    .toSorted((a, b) => b.edition - a.edition)
    .map(({ edition, state }) => ({
      value: editionName(code, edition),
      specId: id,
      edition,
      state,
      words: `${title}, edition ${edition}${state === 'approved' ? '' : ` (${state})`}`,
    }));
}
