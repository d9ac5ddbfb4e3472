import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule, Validators, type ValidatorFn } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel } from '@angular/material/form-field';
import { MatOption, MatSelect } from '@angular/material/select';
import { Router } from '@angular/router';
import type { CarFile } from '@second-spanner/shared/contracts/car-files';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { NewSheetRequest, Sheet } from '@second-spanner/shared/contracts/sheets';
import type { SpecSummary } from '@second-spanner/shared/contracts/spec';
import { toApiProblem, type ApiProblem } from '../../http/api-problem';
import { allPages } from '../../list/all-pages';
import { SessionStore } from '../../session/session-store';
import { LoadState } from '../../states/load-state';
import { ProblemLine } from '../../states/problem-line';
import { roleNames } from '../../words/names';

const chosen = (): FormControl<string> =>
  new FormControl('', { nonNullable: true, validators: [Validators.required] });

const twoPeople: ValidatorFn = ({ value }) => {
  const { builderId, countersignerId } = value as NewSheetRequest;
  return builderId !== '' && builderId === countersignerId ? { onePerson: true } : null;
};

/** Starts a sheet for a car: from which approved edition, who builds, who is the second person. */
@Component({
  selector: 'ss-start-sheet',
  imports: [
    LoadState,
    MatButton,
    MatError,
    MatFormField,
    MatLabel,
    MatOption,
    MatSelect,
    ProblemLine,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './start-sheet.html',
  styleUrl: './start-sheet.scss',
})
export class StartSheet {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly sessions = inject(SessionStore);

  readonly car = input.required<CarFile>();

  protected readonly specs = rxResource({ stream: () => allPages<SpecSummary>(this.http, '/api/specs') });
  protected readonly people = httpResource<readonly PersonName[]>(() => '/api/people');
  protected readonly roleNames = roleNames;

  protected readonly editions = computed(() => {
    const specs = this.specs.hasValue() ? this.specs.value() : [];
    const ofThisEngine = (code: string): number => (code === this.car().engineCode ? 0 : 1);
    return specs
      .toSorted((a, b) => ofThisEngine(a.code) - ofThisEngine(b.code))
      .flatMap(({ code, title, editions }) =>
        editions
          .filter(({ state }) => state === 'approved')
          .toSorted((a, b) => b.edition - a.edition)
          .map(({ id, edition }) => ({ id, engineCode: code, name: `${title}, edition ${edition}` })),
      );
  });
  protected readonly builders = computed(() => this.thoseWho('entries.record'));
  protected readonly countersigners = computed(() => this.thoseWho('second-checks.make'));

  protected readonly form = new FormGroup(
    { specEditionId: chosen(), builderId: chosen(), countersignerId: chosen() },
    { validators: [twoPeople] },
  );
  protected readonly isStarting = signal(false);
  protected readonly problem = signal<ApiProblem | null>(null);

  constructor() {
    // What there is little choice about is chosen already; it can be changed.
    effect(() => {
      const { specEditionId, builderId } = this.form.controls;
      const ofThisEngine = this.editions().find(({ engineCode }) => engineCode === this.car().engineCode);
      if (specEditionId.pristine && ofThisEngine) specEditionId.setValue(ofThisEngine.id);
      const self = this.builders().find(({ id }) => id === this.sessions.person()?.id);
      if (builderId.pristine && self?.role === 'builder') builderId.setValue(self.id);
    });
  }

  protected start(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.isStarting()) return;
    this.isStarting.set(true);
    this.problem.set(null);
    const request: NewSheetRequest = { carId: this.car().id, ...this.form.getRawValue() };
    this.http.post<Sheet>('/api/sheets', request).subscribe({
      next: ({ id }) => void this.router.navigate(['/sheets', id]),
      error: (error: unknown) => {
        this.isStarting.set(false);
        this.problem.set(toApiProblem(error));
      },
    });
  }

  private thoseWho(permission: Parameters<typeof may>[1]): readonly PersonName[] {
    const people = this.people.hasValue() ? this.people.value() : [];
    return people.filter(({ role }) => may(role, permission));
  }
}
