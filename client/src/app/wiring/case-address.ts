import { inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { filter } from 'rxjs';
import { fromQuery, toQuery } from '@second-spanner/shared/workings/wiring-map/query';
import type { WiringForm } from '@second-spanner/shared/workings/wiring-map/wiring-form';

const own = 'wiring case written to the address';

export interface CaseAddress {
  write(form: WiringForm): void;
}

/**
 * Keeps the whole case in the address, so that it can be sent and opens again. `opened` is called for the
 * address as it is, and whenever another one is opened. Call in an injection context.
 */
export function caseAddress(opened: (form: WiringForm) => void): CaseAddress {
  const router = inject(Router);
  const route = inject(ActivatedRoute);
  route.queryParamMap
    .pipe(
      filter(() => router.currentNavigation()?.extras.info !== own),
      takeUntilDestroyed(),
    )
    .subscribe((params) => opened(fromQuery((name) => params.get(name))));
  return {
    write: (form) => {
      void router.navigate([], {
        relativeTo: route,
        queryParams: toQuery(form),
        replaceUrl: true,
        info: own,
      });
    },
  };
}
