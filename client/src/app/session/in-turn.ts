import { defer, firstValueFrom, type Observable } from 'rxjs';

/**
 * Runs a task while no other window of this browser runs one under the same name. A browser without locks runs it
 * at once.
 * @param alone the task where windows cannot know of each other
 * @param inTurn the task once it is this window's turn; another window may have done it meanwhile
 */
export function oneWindowAtOnce<T>(
  name: string,
  { alone, inTurn }: { readonly alone: () => Observable<T>; readonly inTurn: () => Observable<T> },
): Observable<T> {
  const whenFree = async (): Promise<T> =>
    await navigator.locks.request(name, () => firstValueFrom(inTurn()));
  return defer(() => ('locks' in navigator ? whenFree() : alone()));
}
