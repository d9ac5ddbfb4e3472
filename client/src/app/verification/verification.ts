import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { SignatureMeaning, Verification } from '@second-spanner/shared/contracts/sheets';
import { ApiProblem } from '../http/api-problem';
import { Mark } from '../layout/mark';
import { EmptyState } from '../states/empty-state';
import { LoadState } from '../states/load-state';
import { VerdictLine } from '../verdict/verdict';
import { When } from '../words/dates';

const meanings: Readonly<Record<SignatureMeaning, string>> = {
  built: 'Built',
  countersigned: 'Countersigned',
  released: 'Released',
};

/** For anyone with the code on the paper: whether that sheet is the one that was signed. */
@Component({
  selector: 'ss-verification',
  imports: [EmptyState, LoadState, Mark, VerdictLine, When],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './verification.html',
  styleUrl: './verification.scss',
})
export class VerificationPage {
  readonly code = input.required<string>();

  protected readonly read = httpResource<Verification>(
    () => `/api/verifications/${encodeURIComponent(this.code())}`,
  );
  protected readonly found = computed(() => (this.read.hasValue() ? this.read.value() : null));
  protected readonly isUnknown = computed(() => {
    const error = this.read.error();
    return error instanceof ApiProblem && error.status === 404;
  });
  protected readonly meanings = meanings;
}
