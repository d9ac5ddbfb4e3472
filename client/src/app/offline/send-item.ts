import { HttpClient, HttpEventType, HttpResponse, type HttpEvent } from '@angular/common/http';
import { inject, Injectable, signal } from '@angular/core';
import type { StepDetail, StoredFile } from '@second-spanner/shared/contracts/sheets';
import { filter, finalize, firstValueFrom, map, tap, timeout } from 'rxjs';
import { ApiProblem, toApiProblem } from '../http/api-problem';
import { TrayDb } from './tray-db';
import type { TrayItem } from './tray-item';

/** What became of an entry that was sent. */
export type Sent =
  | { readonly state: 'kept'; readonly step: StepDetail }
  | { readonly state: 'waiting'; readonly problem: ApiProblem }
  | { readonly state: 'refused'; readonly problem: ApiProblem };

/** Longer than this, a weak network counts as none: the entry waits and is sent again. */
const patience = { entry: 20_000, photo: 120_000 };

/** These may go well when tried again later: no network, signed out, too many tries, the server unwell. */
const mayPass = ({ status }: ApiProblem): boolean =>
  status === 0 || status === 401 || status === 429 || status >= 500;

/** Sends one entry of the tray, its photo first where it has one. */
@Injectable({ providedIn: 'root' })
export class SendItem {
  private readonly http = inject(HttpClient);
  private readonly db = inject(TrayDb);

  /** How much of a photo is sent, 0 to 1; null while none is. */
  readonly photoShare = signal<number | null>(null);

  async send(item: TrayItem): Promise<Sent> {
    try {
      const ready = await this.withPhotoStored(item);
      const { sheetId, stepCode, request, key } = ready;
      const url = `/api/sheets/${sheetId}/steps/${encodeURIComponent(stepCode)}/entries`;
      const post = this.http.post<StepDetail>(url, request, { headers: { 'Idempotency-Key': key } });
      return { state: 'kept', step: await firstValueFrom(post.pipe(timeout(patience.entry))) };
    } catch (error) {
      const problem = problemOf(error);
      return { state: mayPass(problem) ? 'waiting' : 'refused', problem };
    }
  }

  /** A photo is stored once: its id is kept with the item before the entry goes. */
  private async withPhotoStored(item: TrayItem): Promise<TrayItem> {
    const { photo, request } = item;
    if (photo === undefined || request.content.kind !== 'photo') return item;
    const form = new FormData();
    form.append('file', new Blob([photo.bytes], { type: photo.type }), 'photo');
    const upload = this.http
      .post<StoredFile>('/api/files', form, { reportProgress: true, observe: 'events' })
      .pipe(
        timeout({ each: patience.photo }),
        tap((event) => this.photoShare.set(shareOf(event) ?? this.photoShare())),
        filter((event) => event instanceof HttpResponse),
        map(({ body }) => body?.id ?? ''),
        finalize(() => this.photoShare.set(null)),
      );
    const id = await firstValueFrom(upload);
    const ready: TrayItem = {
      ...item,
      request: { ...request, content: { ...request.content, fileId: id } },
      photo: undefined,
    };
    await this.db.put(ready);
    return ready;
  }
}

function problemOf(error: unknown): ApiProblem {
  const isTimeout = error instanceof Error && error.name === 'TimeoutError';
  return isTimeout ? new ApiProblem(0, 'The network is too weak just now.') : toApiProblem(error);
}

function shareOf(event: HttpEvent<unknown>): number | null {
  if (event.type !== HttpEventType.UploadProgress || event.total === undefined) return null;
  return event.loaded / event.total;
}
