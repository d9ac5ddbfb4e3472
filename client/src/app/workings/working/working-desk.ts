import { DOCUMENT } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  input,
  signal,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { judgementSign, judgementWord } from '@second-spanner/shared/workings/judgement-words';
import { typedLines, workingText } from '@second-spanner/shared/workings/working-text';
import { begunFrom, type Working, type WorkingCase } from '@second-spanner/shared/workings/working';
import { Cell } from '../../layout/cell';
import { TitleBlock } from '../../layout/title-block';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { VerdictLine } from '../../verdict/verdict';
import { printMoment } from '../../words/dates';
import { TradeWords } from '../../words/trade-words';
import { WorkingActs } from '../acts/working-acts';
import { AnswerParts } from '../answer/answer-parts';
import { Grounds } from '../answer/grounds';
import { Judged } from '../answer/judged';
import { NotYet } from '../answer/not-yet';
import { Spoken } from '../answer/spoken';
import { caseAddress } from '../case-address';
import { GroupStrip } from '../group-strip';
import { groupNames } from '../groups';
import { keptCase } from '../kept-case';
import { SpecEditions } from '../spec-editions';
import { WorkingFieldControl } from './working-field';
import { isSameCase, onlyOwn, strayErrors, visibleSections } from './case';
import { WorkingStart } from './working-start';

/** A working as it is used: what is typed, what comes of it as one types, and what may be done with it. */
@Component({
  selector: 'ss-working-desk',
  imports: [
    AnswerParts,
    Cell,
    Grounds,
    GroupStrip,
    Judged,
    NotYet,
    RouterLink,
    Sentence,
    Spoken,
    TitleBlock,
    TradeWords,
    VerdictLine,
    WorkingActs,
    WorkingFieldControl,
    WorkingStart,
  ],
  providers: [SpecEditions],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './working-desk.html',
  styleUrl: './working-desk.scss',
})
export class WorkingDesk {
  private readonly document = inject(DOCUMENT);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly sessions = inject(SessionStore);

  readonly working = input.required<Working>();

  private readonly opened = signal<WorkingCase>({});
  private readonly address = caseAddress((typed) => this.opened.set(typed));
  protected readonly kept = keptCase();

  protected readonly typed = computed(() => onlyOwn(this.working(), this.opened()));
  private readonly options = computed(() => ({ dialect: this.sessions.dialect() }));
  protected readonly answer = computed(() => this.working().workOut(this.typed(), this.options()));

  protected readonly sections = computed(() => visibleSections(this.working(), this.typed()));
  protected readonly fieldSections = computed(() =>
    this.sections()
      .map(({ heading, fields }) => ({ heading, fields: fields.filter(({ kind }) => kind !== 'turn') }))
      .filter(({ fields }) => fields.length > 0),
  );
  /** Turned beside the drawing, not among the fields. */
  protected readonly turns = computed(() =>
    this.sections().flatMap(({ fields }) => fields.filter(({ kind }) => kind === 'turn')),
  );
  /** Lists of many columns need more room than a column of fields has. */
  protected readonly isWide = computed(() =>
    this.fieldSections().some(({ fields }) =>
      fields.some((field) => field.kind === 'rows' && field.columns.length > 2),
    ),
  );

  protected readonly hasAnswer = computed(() => this.answer().parts.length > 0);
  protected readonly strayErrors = computed(() => strayErrors(this.working(), this.typed(), this.answer()));
  private readonly shapes = computed(() =>
    this.answer().parts.filter(({ kind }) => kind === 'drawing' || kind === 'table' || kind === 'steps'),
  );
  /** What is large stands in the middle, drawings first; figures alone stand there too. */
  protected readonly middle = computed(() => {
    const { parts } = this.answer();
    const large = this.shapes();
    if (large.length === 0) return parts.filter(({ kind }) => kind !== 'judgement');
    const isDrawing = (kind: string): boolean => kind === 'drawing';
    return [...large.filter(({ kind }) => isDrawing(kind)), ...large.filter(({ kind }) => !isDrawing(kind))];
  });
  protected readonly beside = computed(() =>
    this.shapes().length === 0 ? [] : this.answer().parts.filter(({ kind }) => kind === 'facts'),
  );

  protected readonly judgement = computed(() =>
    this.answer().parts.find((part) => part.kind === 'judgement'),
  );
  protected readonly sign = judgementSign;
  protected readonly word = judgementWord;
  /** Where nothing is judged, drawn or listed, the first figure is the answer. */
  protected readonly main = computed(() =>
    this.judgement() === undefined && this.shapes().every(({ kind }) => kind === 'steps')
      ? (this.answer().parts.find(({ kind }) => kind === 'facts') ?? null)
      : null,
  );
  /** Whether anything stands beside what is large. */
  protected readonly isJudged = computed(
    () => this.answer().cautions.length > 0 || this.beside().length > 0 || this.judgement() !== undefined,
  );
  /** Nothing is large: the answer needs no columns of its own. */
  protected readonly isPlain = computed(() => this.shapes().length === 0 && this.turns().length === 0);

  protected readonly group = computed(() => groupNames[this.working().group]);
  protected readonly title = computed(() => this.say(this.working().title));
  protected readonly person = computed(() => this.sessions.person()?.name ?? '');
  /** What the case was begun from; of the example it is said as long as nothing is changed. */
  protected readonly origin = computed(() => {
    const begun = this.typed()[begunFrom] ?? '';
    if (begun !== '') return begun;
    return isSameCase(this.working().example.typed, this.typed()) ? 'the example' : null;
  });
  protected readonly lines = computed(() => typedLines(this.working(), this.typed()));
  protected readonly workedOut = computed(() => {
    this.answer();
    return printMoment(new Date().toISOString());
  });
  protected readonly text = (): string =>
    workingText(this.working(), this.typed(), this.answer(), {
      ...this.options(),
      address: this.document.location.href,
    });

  protected change(name: string, text: string): void {
    this.show({ ...this.typed(), [name]: text });
  }

  protected show(typed: WorkingCase): void {
    this.opened.set(typed);
    this.address.write(typed);
  }

  protected goToAnswer(): void {
    const answer = this.host.nativeElement.querySelector<HTMLElement>('.judged, .middle');
    answer?.scrollIntoView({ block: 'start' });
    answer?.focus({ preventScroll: true });
  }

  private say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }
}
