import { HttpClient, HttpParams } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Page } from '@second-spanner/shared/contracts/paging';
import type {
  HistoryLine,
  NewCountersignatureRequest,
  NewSecondReadingRequest,
  NewSnagRequest,
  SendBackRequest,
  SettleSnagRequest,
  Sheet,
  SignRequest,
  StepDetail,
  UnmarkCriticalRequest,
} from '@second-spanner/shared/contracts/sheets';
import type { Observable } from 'rxjs';

/** The address of a step's data. */
export const stepUrl = (sheetId: string, code: string): string =>
  `/api/sheets/${sheetId}/steps/${encodeURIComponent(code)}`;

/** What can be asked of a sheet and done on it, but for entries: those go by way of the waiting tray. */
@Injectable({ providedIn: 'root' })
export class SheetApi {
  private readonly http = inject(HttpClient);

  start(sheetId: string): Observable<Sheet> {
    return this.http.post<Sheet>(`/api/sheets/${sheetId}/start`, {});
  }

  readAgain(
    sheetId: string,
    code: string,
    request: NewSecondReadingRequest,
    key: string,
  ): Observable<StepDetail> {
    return this.postOnce(`${stepUrl(sheetId, code)}/second-readings`, request, key);
  }

  countersign(
    sheetId: string,
    code: string,
    request: NewCountersignatureRequest,
    key: string,
  ): Observable<StepDetail> {
    return this.postOnce(`${stepUrl(sheetId, code)}/countersignatures`, request, key);
  }

  raiseSnag(sheetId: string, code: string, request: NewSnagRequest): Observable<StepDetail> {
    return this.http.post<StepDetail>(`${stepUrl(sheetId, code)}/snags`, request);
  }

  settleSnag(sheetId: string, snagId: string, request: SettleSnagRequest): Observable<StepDetail> {
    return this.http.post<StepDetail>(`/api/sheets/${sheetId}/snags/${snagId}/settlements`, request);
  }

  unmarkCritical(sheetId: string, code: string, request: UnmarkCriticalRequest): Observable<StepDetail> {
    return this.http.put<StepDetail>(`${stepUrl(sheetId, code)}/unmarking`, request);
  }

  callSecondPerson(sheetId: string, code: string): Observable<StepDetail> {
    return this.http.post<StepDetail>(`${stepUrl(sheetId, code)}/calls`, {});
  }

  history(sheetId: string, cursor: string | null): Observable<Page<HistoryLine>> {
    const params = new HttpParams({ fromObject: cursor === null ? {} : { cursor } });
    return this.http.get<Page<HistoryLine>>(`/api/sheets/${sheetId}/history`, { params });
  }

  sign(sheetId: string, request: SignRequest): Observable<Sheet> {
    return this.http.post<Sheet>(`/api/sheets/${sheetId}/signatures`, request);
  }

  sendBack(sheetId: string, request: SendBackRequest): Observable<Sheet> {
    return this.http.post<Sheet>(`/api/sheets/${sheetId}/send-back`, request);
  }

  buildSheet(sheetId: string, paper: 'a4' | 'letter'): Observable<Blob> {
    const url = `/api/sheets/${sheetId}/build-sheet.pdf`;
    return this.http.get(url, { params: { paper }, responseType: 'blob' });
  }

  private postOnce(url: string, body: unknown, key: string): Observable<StepDetail> {
    return this.http.post<StepDetail>(url, body, { headers: { 'Idempotency-Key': key } });
  }
}
