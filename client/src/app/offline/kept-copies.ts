import { HttpClient } from '@angular/common/http';
import { effect, inject, Injectable } from '@angular/core';
import { deleteDB, openDB, type DBSchema, type IDBPDatabase } from 'idb';
import { catchError, defer, from, map, switchMap, tap, throwError, type Observable } from 'rxjs';
import { toApiProblem, type ApiProblem } from '../http/api-problem';
import { SessionStore } from '../session/session-store';

interface CopySchema extends DBSchema {
  readonly copies: {
    readonly key: string;
    readonly value: { readonly name: string; readonly body: unknown };
  };
}

const databaseName = 'second-spanner-copies';

const isUnwell = ({ status }: ApiProblem): boolean => status === 429 || status >= 500;

/**
 * Copies of what was read last, for work without a network. They belong to one person: what one may see another may
 * not, so nobody is ever shown another's, and they go when that person signs out.
 */
@Injectable({ providedIn: 'root' })
export class KeptCopies {
  private readonly http = inject(HttpClient);
  private readonly sessions = inject(SessionStore);
  /** What was read since the page was opened. */
  private readonly readHere = new Set<string>();
  private opened: Promise<IDBPDatabase<CopySchema>> | null = null;

  constructor() {
    effect(() => {
      if (this.sessions.session() === null) void this.forget();
    });
  }

  /** Reads from the api and keeps a copy; without a network the copy, where there is one. */
  read<T>(url: string): Observable<T> {
    return this.http.get<T>(url).pipe(
      tap((body) => void this.keep(url, body)),
      catchError((error: unknown) => {
        const problem = toApiProblem(error);
        // What stands on the page already does not go because the server was unwell once.
        const isPassing = problem.noNetwork || (this.readHere.has(url) && isUnwell(problem));
        return isPassing ? this.copyOf<T>(url, problem) : throwError(() => problem);
      }),
    );
  }

  /** Whether there is a copy from this opening of the page already. */
  wasReadHere(url: string): boolean {
    return this.readHere.has(url);
  }

  /** Keeps what was answered to an act in place of what was read before it. */
  async keep(url: string, body: unknown): Promise<void> {
    this.readHere.add(url);
    try {
      await (await this.open()).put('copies', { name: this.nameOf(url), body });
    } catch {
      // A window that keeps nothing works with the network alone.
    }
  }

  private copyOf<T>(url: string, problem: ApiProblem): Observable<T> {
    return defer(() => from(this.find(url))).pipe(
      catchError(() => from([undefined])),
      switchMap((found) => (found === undefined ? throwError(() => problem) : from([found.body]))),
      // The copy is what the api once answered to the same request.
      map((body) => body as T),
    );
  }

  private async find(url: string): Promise<{ readonly body: unknown } | undefined> {
    return (await this.open()).get('copies', this.nameOf(url));
  }

  private async forget(): Promise<void> {
    this.readHere.clear();
    (await this.opened?.catch(() => null))?.close();
    this.opened = null;
    await deleteDB(databaseName).catch(() => undefined);
  }

  private nameOf(url: string): string {
    return `${this.sessions.person()?.id ?? ''} ${url}`;
  }

  private open(): Promise<IDBPDatabase<CopySchema>> {
    this.opened ??= openDB<CopySchema>(databaseName, 1, {
      upgrade: (database) => {
        database.createObjectStore('copies', { keyPath: 'name' });
      },
    });
    return this.opened;
  }
}
