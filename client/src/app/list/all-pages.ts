import type { HttpClient } from '@angular/common/http';
import type { Page } from '@second-spanner/shared/contracts/paging';
import { EMPTY, expand, map, reduce, type Observable } from 'rxjs';

const mostAtOnce = 200;

/** All items of a paged list, page after page: for lists that are short enough to be sorted on the page. */
export function allPages<T>(http: HttpClient, url: string): Observable<readonly T[]> {
  const read = (cursor: string | null): Observable<Page<T>> =>
    http.get<Page<T>>(url, { params: { limit: mostAtOnce, ...(cursor === null ? {} : { cursor }) } });
  return read(null).pipe(
    expand(({ next }) => (next === null ? EMPTY : read(next))),
    map(({ items }) => items),
    reduce((all: readonly T[], items) => [...all, ...items], []),
  );
}
