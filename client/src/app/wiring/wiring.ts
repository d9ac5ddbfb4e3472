import { DOCUMENT, NgComponentOutlet, NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { rotorWords } from '@second-spanner/shared/workings/wiring-map/fact-words';
import { fromQuery, toCase } from '@second-spanner/shared/workings/wiring-map/query';
import { workOut } from '@second-spanner/shared/workings/wiring-map/work-out';
import {
  blankForm,
  isSameEngine,
  type WiringForm,
} from '@second-spanner/shared/workings/wiring-map/wiring-form';
import { wiringMapWorking } from '@second-spanner/shared/workings/wiring-map/wiring-map';
import { workingText } from '@second-spanner/shared/workings/working-text';
import { ChosenField } from '../fields/chosen-field';
import { toApiProblem, type ApiProblem } from '../http/api-problem';
import { Cell } from '../layout/cell';
import { TitleBlock } from '../layout/title-block';
import { SessionStore } from '../session/session-store';
import { Wide } from '../sheets/wide';
import { laterPart, type LoadPart } from '../states/later-part';
import { LoadState } from '../states/load-state';
import { ProblemLine } from '../states/problem-line';
import { VerdictLine } from '../verdict/verdict';
import { printMoment } from '../words/dates';
import { TradeWords } from '../words/trade-words';
import { WorkingActs } from '../workings/acts/working-acts';
import { caseAddress } from '../workings/case-address';
import { keptCase } from '../workings/kept-case';
import { isSameCase } from '../workings/working/case';
import { GroupStrip } from '../workings/group-strip';
import { editionName, SpecEditions } from '../workings/spec-editions';
import { EngineFacts } from './answer/engine-facts';
import { Judgement } from './answer/judgement';
import { LeadTable } from './answer/lead-table';
import { EngineFields } from './fields/engine-fields';
import { FittedCells } from './fields/fitted-cells';
import { SpecEngines } from './spec-engines';

const typedIn = '';
const longestInHead = 16;

const loadCap: LoadPart = async () => (await import('./answer/cap-figure')).CapFigure;
const loadStrip: LoadPart = async () => (await import('./answer/strip-figure')).StripFigure;

/** The wiring map by itself: an engine of the spec book or one typed in, its cap, and what is wrong with its leads. */
@Component({
  selector: 'ss-wiring',
  imports: [
    Cell,
    ChosenField,
    EngineFacts,
    EngineFields,
    FittedCells,
    GroupStrip,
    Judgement,
    LeadTable,
    LoadState,
    MatButton,
    NgComponentOutlet,
    NgTemplateOutlet,
    ProblemLine,
    RouterLink,
    TitleBlock,
    TradeWords,
    VerdictLine,
    WorkingActs,
  ],
  providers: [SpecEditions, SpecEngines],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './wiring.html',
  styleUrl: './wiring.scss',
})
export class WiringPage {
  private readonly document = inject(DOCUMENT);
  private readonly sessions = inject(SessionStore);
  protected readonly engines = inject(SpecEngines);
  protected readonly isDesk = inject(Wide).isDesk;

  protected readonly kept = keptCase();
  protected readonly form = signal<WiringForm>(blankForm);
  /** The engine's fields stand open until there is a map, and when they are asked for. */
  protected readonly engineOpen = signal(true);
  protected readonly problem = signal<ApiProblem | null>(null);

  private readonly address = caseAddress((typed) => {
    const form = fromQuery((name) => typed[name] ?? null);
    this.form.set(form);
    this.engineOpen.set(workOut(form).map === null);
  });

  protected readonly answer = computed(() => workOut(this.form()));
  protected readonly traced = computed(() => this.form().outlets === 'traced');
  private readonly named = computed(() => editionName(this.form().spec, this.form().edition));
  private readonly specEngine = rxResource({
    params: () => (this.engines.has(this.named()) ? this.named() : undefined),
    stream: ({ params }) => this.engines.engine(params),
  });
  /** The spec that the fields are still as in; another engine, or a changed one, is typed in. */
  protected readonly spec = computed(() => {
    const engine = this.specEngine.hasValue() ? this.specEngine.value() : undefined;
    return engine !== undefined && isSameEngine(engine, this.form()) ? this.named() : typedIn;
  });
  protected readonly choices = computed(() => [
    { value: typedIn, words: 'typed in' },
    ...this.engines.choices(),
  ]);
  protected readonly engineName = computed(() => {
    const { spec, edition } = this.form();
    return this.spec() === typedIn ? 'typed in' : `${spec}, edition ${edition}`;
  });
  /** Longer orders stand with the engine's facts alone. */
  protected readonly order = computed(() => {
    const order = this.answer().cap?.firingOrder.join('-') ?? '';
    return order.length <= longestInHead ? order : '';
  });
  protected readonly person = computed(() => this.sessions.person()?.name ?? '');
  protected readonly rotor = computed(() => rotorWords(this.form()));
  /** When the answer that is shown was worked out: for the paper. */
  protected readonly workedOut = computed(() => {
    this.answer();
    return printMoment(new Date().toISOString());
  });

  private readonly options = computed(() => ({ dialect: this.sessions.dialect() }));
  /** Only a map is drawn, and only then the drawings are downloaded. */
  private readonly hasMap = computed(() => this.answer().map !== null);
  protected readonly capFigure = laterPart(() => (this.hasMap() ? loadCap : undefined));
  private readonly hasDiagnosis = computed(() => this.answer().diagnosis !== null);
  protected readonly strip = laterPart(() => (this.hasDiagnosis() ? loadStrip : undefined));
  protected readonly typed = computed(() => toCase(this.form()));
  protected readonly isBlank = computed(() => isSameCase(toCase(blankForm), this.typed()));
  /** The name that a kept copy is offered. */
  protected readonly keptTitle = computed(() =>
    this.spec() === typedIn ? 'Wiring map' : `Wiring map, ${this.engineName()}`,
  );
  protected readonly text = (): string => {
    const options = this.options();
    const answer = wiringMapWorking.workOut(this.typed(), options);
    const address = this.document.location.href;
    return workingText(wiringMapWorking, this.typed(), answer, { ...options, address });
  };

  protected change(changes: Partial<WiringForm>): void {
    this.show({ ...this.form(), ...changes });
  }

  protected choose(name: string): void {
    this.problem.set(null);
    if (name === typedIn) {
      this.change({ spec: '', edition: '' });
      return;
    }
    this.engines.engine(name).subscribe({
      next: (form) => {
        this.engineOpen.set(false);
        this.show(form);
      },
      error: (error: unknown) => this.problem.set(toApiProblem(error)),
    });
  }

  protected tryExample(): void {
    const { typed } = wiringMapWorking.example;
    this.engineOpen.set(false);
    this.show(fromQuery((name) => typed[name] ?? null));
  }

  protected emptyFitted(): void {
    this.change({ fitted: {} });
  }

  private show(form: WiringForm): void {
    this.form.set(form);
    this.address.write(this.typed());
  }
}
