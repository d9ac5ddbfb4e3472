import type { SheetChanged } from '@second-spanner/shared/contracts/sheets';
import { defer, Observable, retry, tap, timer } from 'rxjs';

/** What is heard of a sheet: that it changed, or that the line is open again and changes may have been missed. */
export type SheetNews = SheetChanged | 'line-open';

const openedAgainAfter = 3_000;

/** One line to the api on which it tells of changes; fails when the browser gives the line up. */
function openLine(sheetId: string): Observable<SheetNews> {
  return new Observable((subscriber) => {
    const source = new EventSource(`/api/sheets/${sheetId}/events`);
    source.addEventListener('open', () => subscriber.next('line-open'));
    source.addEventListener('changed', (event) =>
      subscriber.next(JSON.parse(event.data as string) as SheetChanged),
    );
    source.addEventListener('error', () => {
      // While it connects the browser tries by itself; a closed line, as after signing in anew, is ours to open.
      if (source.readyState === EventSource.CLOSED) subscriber.error(new Error('The line was closed.'));
    });
    return () => source.close();
  });
}

/**
 * News of a sheet for as long as one listens. A line that was given up is opened again after a moment.
 * @param beforeReopening called before each new try, to renew the session where that was the reason
 */
export function sheetNews(sheetId: string, beforeReopening: () => void): Observable<SheetNews> {
  return defer(() => openLine(sheetId)).pipe(
    retry({ delay: () => timer(openedAgainAfter).pipe(tap(beforeReopening)) }),
  );
}
