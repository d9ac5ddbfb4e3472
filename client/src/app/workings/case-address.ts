import { DestroyRef, inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import type { WorkingCase } from '@second-spanner/shared/workings/working';
import { debounceTime, filter, Subject } from 'rxjs';

const own = 'case written to the address';
/** Browsers take only so many changes of the address in a time. */
const pause = 150;

export interface CaseAddress {
  /** Soon the address is this case's; fields left open are not in it. */
  write(typed: WorkingCase): void;
}

/**
 * Keeps the whole case in the address, so that it can be sent and opens again. `opened` is called for the
 * address as it is, and whenever another one is opened. Call in an injection context.
 */
export function caseAddress(opened: (typed: WorkingCase) => void): CaseAddress {
  const router = inject(Router);
  const route = inject(ActivatedRoute);
  const untilGone = inject(DestroyRef);
  route.queryParamMap
    .pipe(
      filter(() => router.currentNavigation()?.extras.info !== own),
      takeUntilDestroyed(untilGone),
    )
    .subscribe((query) =>
      opened(Object.fromEntries(query.keys.map((name) => [name, query.get(name) ?? '']))),
    );

  const written = new Subject<WorkingCase>();
  written
    .pipe(
      debounceTime(pause),
      // Whoever is on the way to another page is not called back.
      filter(() => router.currentNavigation() === null),
      takeUntilDestroyed(untilGone),
    )
    .subscribe((typed) => {
      const queryParams = Object.fromEntries(Object.entries(typed).filter(([, text]) => text !== ''));
      void router.navigate([], { relativeTo: route, queryParams, replaceUrl: true, info: own });
    });
  return { write: (typed) => written.next(typed) };
}
