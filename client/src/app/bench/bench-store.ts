import { httpResource } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import type { Bench } from '@second-spanner/shared/contracts/sheets';
import { SessionStore } from '../session/session-store';

/** What waits for the signed-in person: for the bench itself and for its count in the navigation. */
@Injectable({ providedIn: 'root' })
export class BenchStore {
  private readonly sessions = inject(SessionStore);

  readonly bench = httpResource<Bench>(() => (this.sessions.person() === null ? undefined : '/api/bench'));
  readonly count = computed(() => (this.bench.hasValue() ? this.bench.value().items.length : 0));
}
