import { effect, inject, Injectable, type Signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router, type ParamMap, type Params } from '@angular/router';

/** Where each list was last left, as long as the page lives. */
@Injectable({ providedIn: 'root' })
export class ListMemory {
  readonly last = new Map<string, Params>();
}

export interface ListAddress {
  readonly params: Signal<ParamMap>;
  /** Changes some of the address; null takes one out. The list's place in the history stays one. */
  set(changes: Params): void;
}

/**
 * Keeps a list's search, order and page in its address. Opened without any, the list is where it was left.
 * Call in an injection context.
 */
export function listAddress(list: string): ListAddress {
  const router = inject(Router);
  const route = inject(ActivatedRoute);
  const { last } = inject(ListMemory);
  const params = toSignal(route.queryParamMap, { requireSync: true });

  const set = (changes: Params): void => {
    void router.navigate([], {
      relativeTo: route,
      queryParams: changes,
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  };

  const left = last.get(list);
  if (params().keys.length === 0 && left !== undefined) set(left);
  effect(() => {
    const current = params();
    last.set(list, Object.fromEntries(current.keys.map((key) => [key, current.get(key)])));
  });
  return { params, set };
}
