import { ChangeDetectionStrategy, Component, computed, inject, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Working, WorkingCase } from '@second-spanner/shared/workings/working';
import { ChosenField, type Choice } from '../../fields/chosen-field';
import { toApiProblem, type ApiProblem } from '../../http/api-problem';
import { Sentence } from '../../quantity/sentence';
import { LoadState } from '../../states/load-state';
import { ProblemLine } from '../../states/problem-line';
import { SpecEditions } from '../spec-editions';

/** A case to begin with, and where it comes from. */
export interface StartCase {
  readonly typed: WorkingCase;
  /** Null for nothing typed at all. */
  readonly from: string | null;
}

const nothing = '';

/** What the fields can begin with: an engine of the spec book, the worked example, or nothing. */
@Component({
  selector: 'ss-working-start',
  imports: [ChosenField, LoadState, MatButton, ProblemLine, Sentence],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './working-start.html',
  styleUrl: './working-start.scss',
})
export class WorkingStart {
  protected readonly editions = inject(SpecEditions);

  readonly working = input.required<Working>();
  readonly typed = input.required<WorkingCase>();
  readonly begun = output<StartCase>();

  protected readonly edition = signal(nothing);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly cases = signal<readonly { readonly name: string; readonly start: StartCase }[]>([]);
  protected readonly chosenCase = signal(nothing);
  protected readonly isRead = signal(false);

  protected readonly fromSpec = computed(
    () => this.editions.mayRead && this.working().fromSpec !== undefined,
  );
  protected readonly editionChoices = computed<readonly Choice[]>(() => [
    { value: nothing, words: 'typed in' },
    ...this.editions
      .all()
      .filter(({ state }) => state === 'approved')
      .map(({ value, words }) => ({ value, words })),
  ]);
  protected readonly caseChoices = computed<readonly Choice[]>(() => [
    ...(this.chosenCase() === nothing ? [{ value: nothing, words: 'choose…' }] : []),
    ...this.cases().map(({ name }, i) => ({ value: String(i), words: name })),
  ]);
  protected readonly isBlank = computed(() => Object.values(this.typed()).every((text) => text === ''));

  protected chooseEdition(name: string): void {
    this.edition.set(name);
    this.cases.set([]);
    this.chosenCase.set(nothing);
    this.problem.set(null);
    this.isRead.set(false);
    const [code = '', edition = ''] = name.split(',');
    this.editions.read(name).subscribe({
      next: ({ document }) => {
        this.isRead.set(true);
        const given = this.working().fromSpec?.(document) ?? [];
        this.cases.set(
          given.map(({ name, typed }) => ({ name, start: { typed, from: `${code}, edition ${edition}` } })),
        );
        if (given.length === 1) this.chooseCase('0');
      },
      error: (error: unknown) => this.problem.set(toApiProblem(error)),
    });
  }

  protected chooseCase(at: string): void {
    const chosen = this.cases()[Number(at)];
    if (chosen === undefined) return;
    this.chosenCase.set(at);
    this.begun.emit(chosen.start);
  }

  protected tryExample(): void {
    this.forget();
    this.begun.emit({ typed: this.working().example.typed, from: 'the example' });
  }

  protected clear(): void {
    this.forget();
    this.begun.emit({ typed: {}, from: null });
  }

  private forget(): void {
    this.edition.set(nothing);
    this.cases.set([]);
    this.chosenCase.set(nothing);
  }
}
