import { HttpErrorResponse } from '@angular/common/http';
import type { FieldError } from '@second-spanner/shared/contracts/input-error';
import type { Problem } from '@second-spanner/shared/contracts/problem';

/** Why a request brought no answer. Status 0: the api could not be reached at all. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';

  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail: string | null = null,
    readonly errors: readonly FieldError[] = [],
  ) {
    super(detail ?? title);
  }

  get noNetwork(): boolean {
    return this.status === 0;
  }

  /** The message for a field by its path, or null. */
  errorAt(field: string): string | null {
    return this.errors.find((error) => error.field === field)?.message ?? null;
  }

  /** A sentence for people: what the api said, or what its silence means. */
  get sentence(): string {
    return this.detail ?? this.title;
  }
}

const isProblem = (body: unknown): body is Problem =>
  typeof body === 'object' && body !== null && 'title' in body && typeof body.title === 'string';

/** Problem Details, a bare status or no answer, all as one typed error. */
export function toApiProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  if (!(error instanceof HttpErrorResponse)) {
    return new ApiProblem(500, 'Something went wrong on this page.');
  }
  if (error.status === 0 || error.status === 504) {
    return new ApiProblem(0, 'No network. The shop’s server can’t be reached.');
  }
  const body: unknown = error.error;
  if (isProblem(body)) {
    return new ApiProblem(error.status, body.title, body.detail ?? null, body.errors ?? []);
  }
  return new ApiProblem(error.status, wordsFor(error.status));
}

function wordsFor(status: number): string {
  if (status === 401) return 'You are signed out.';
  if (status === 403) return 'This isn’t yours to do.';
  if (status === 404) return 'There is nothing here, or it isn’t yours to see.';
  if (status === 429) return 'Too many tries. Wait a minute, then try again.';
  return 'The shop’s server could not answer. Nothing was changed.';
}
