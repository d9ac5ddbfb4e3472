import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  untracked,
} from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { begunFrom, type Working, type WorkingCase } from '@second-spanner/shared/workings/working';
import { map } from 'rxjs';
import { ChosenField, type Choice } from '../../fields/chosen-field';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { LoadState } from '../../states/load-state';
import { isBegun, readBegun, sayBegun } from '../begun-from';
import { SpecEditions } from '../spec-editions';

const nothing = '';

/** What the fields can begin with: an engine of the spec book, the worked example, or nothing. */
@Component({
  selector: 'ss-working-start',
  imports: [ChosenField, LoadState, MatButton, Sentence],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './working-start.html',
  styleUrl: './working-start.scss',
})
export class WorkingStart {
  private readonly dialect = inject(SessionStore).dialect;
  protected readonly editions = inject(SpecEditions);

  readonly working = input.required<Working>();
  readonly typed = input.required<WorkingCase>();
  readonly begun = output<WorkingCase>();

  /** An edition that was chosen, of whose cases none has been begun yet. */
  private readonly picked = signal<string | null>(null);
  private readonly begunOf = computed(() => readBegun(this.typed()[begunFrom] ?? ''));
  protected readonly edition = computed(() => this.picked() ?? this.begunOf()?.edition ?? nothing);
  protected readonly cases = rxResource({
    params: () => (this.fromSpec() && this.editions.has(this.edition()) ? this.edition() : undefined),
    stream: ({ params }) =>
      this.editions.read(params).pipe(map(({ document }) => this.working().fromSpec?.(document) ?? [])),
  });
  protected readonly given = computed(() => (this.cases.hasValue() ? this.cases.value() : []));
  protected readonly chosenCase = computed(() => {
    const begun = this.begunOf();
    if (begun?.edition !== this.edition()) return nothing;
    const at = this.given().findIndex(({ name }) => isBegun(begun, name));
    return at < 0 ? nothing : String(at);
  });

  protected readonly fromSpec = computed(
    () => this.editions.mayRead && this.working().fromSpec !== undefined,
  );
  protected readonly editionChoices = computed<readonly Choice[]>(() => [
    { value: nothing, words: 'typed in' },
    ...this.editions
      .all()
      .filter(({ state, value }) => state === 'approved' || value === this.edition())
      .map(({ value, words }) => ({ value, words })),
  ]);
  protected readonly caseChoices = computed<readonly Choice[]>(() => [
    ...(this.chosenCase() === nothing ? [{ value: nothing, words: 'choose…' }] : []),
    ...this.given().map(({ name }, i) => ({ value: String(i), words: name })),
  ]);
  protected readonly isBlank = computed(() => Object.values(this.typed()).every((text) => text === ''));

  constructor() {
    // An edition with one case alone leaves nothing to choose.
    effect(() => {
      const given = this.given();
      if (this.picked() !== null && given.length === 1) untracked(() => this.chooseCase('0'));
    });
  }

  protected chooseEdition(name: string): void {
    this.picked.set(name === nothing ? null : name);
    if (name === nothing) this.begun.emit({ ...this.typed(), [begunFrom]: '' });
  }

  protected chooseCase(at: string): void {
    const chosen = this.given()[Number(at)];
    if (chosen === undefined) return;
    const name = tradeText(chosen.name, this.dialect());
    this.begun.emit({ ...chosen.typed, [begunFrom]: sayBegun(this.edition(), name) });
    this.picked.set(null);
  }

  protected tryExample(): void {
    this.start(this.working().example.typed);
  }

  protected clear(): void {
    this.start({});
  }

  private start(typed: WorkingCase): void {
    this.picked.set(null);
    this.begun.emit(typed);
  }
}
