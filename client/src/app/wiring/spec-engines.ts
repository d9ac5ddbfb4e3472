import { computed, inject, Injectable } from '@angular/core';
import { formOfSpec } from '@second-spanner/shared/workings/wiring-map/form-of-spec';
import type { WiringForm } from '@second-spanner/shared/workings/wiring-map/wiring-form';
import { map, type Observable } from 'rxjs';
import type { Choice } from '../fields/chosen-field';
import { SpecEditions } from '../workings/spec-editions';

/** The engines of the shop's spec book, for those who may read it; for others there are none. */
@Injectable()
export class SpecEngines {
  private readonly editions = inject(SpecEditions);
  readonly mayRead = this.editions.mayRead;
  readonly specs = this.editions.specs;

  readonly choices = computed<readonly Choice[]>(() =>
    this.editions.all().map(({ value, words }) => ({ value, words })),
  );

  /** Whether the spec book has this edition. */
  has(name: string): boolean {
    return this.editions.has(name);
  }

  /** The engine of an edition; nothing where there is no such edition. */
  engine(name: string): Observable<WiringForm> {
    return this.editions.read(name).pipe(map(formOfSpec));
  }
}
