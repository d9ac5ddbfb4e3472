import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { KeepWorkingRequest, KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import type { WorkingCase } from '@second-spanner/shared/workings/working';
import { map, type Observable } from 'rxjs';
import { namedFile, type NamedFile } from '../http/save-file';
import { allPages } from '../list/all-pages';

export type Paper = 'a4' | 'letter';

/** What the api does with workings: it keeps them with a car, and prints them. */
@Injectable({ providedIn: 'root' })
export class WorkingsApi {
  private readonly http = inject(HttpClient);

  cars(): Observable<readonly CarSummary[]> {
    return allPages<CarSummary>(this.http, '/api/cars');
  }

  keep(carId: string, request: KeepWorkingRequest): Observable<KeptWorking> {
    return this.http.post<KeptWorking>(`/api/cars/${carId}/workings`, request);
  }

  /** A case as it stands on the page, on paper. */
  pdf(working: string, typed: WorkingCase, paper: Paper): Observable<NamedFile> {
    return this.file(`/api/workings/${working}/pdf`, { ...typed, paper });
  }

  keptPdf({ carId, id }: KeptWorking, paper: Paper): Observable<NamedFile> {
    return this.file(`/api/cars/${carId}/workings/${id}/pdf`, { paper });
  }

  private file(address: string, params: Readonly<Record<string, string>>): Observable<NamedFile> {
    return this.http.get(address, { params, responseType: 'blob', observe: 'response' }).pipe(map(namedFile));
  }
}
